import { memo, useId } from 'react';
import { useTheme } from '@/components/ui/theme';
import { arrowheadPath, type PlanePicture, round2 } from '@/figures';
import { ChartLabel, ChartText } from './chart-text';
import { CurvePath } from './curve-path';
import { KerbCircle, KerbOutline } from './kerb-stripe';

const SHADE = 0.07;

const Ground = memo(function Ground({ picture: { contours, grid, axes, unitCircle } }: { picture: PlanePicture }) {
  const { colors } = useTheme();
  return (
    <g>
      <path d={grid} stroke={colors.rule} strokeWidth={1} fill="none" />
      {contours.shaded.map((d, i) => (
        <path key={i} d={d} fill={colors.contour} fillOpacity={SHADE} />
      ))}
      <path d={contours.fine} stroke={colors.contour} strokeWidth={0.7} fill="none" />
      <path d={contours.strong} stroke={colors.contour} strokeWidth={1.4} fill="none" />
      <path d={unitCircle} stroke={colors.rule2} strokeWidth={1} strokeDasharray="2 3" fill="none" />
      <path d={axes} stroke={colors.rule2} strokeWidth={1} fill="none" />
    </g>
  );
});

function Kerbs({ kerbs }: Pick<PlanePicture, 'kerbs'>) {
  return kerbs.map((kerb, i) =>
    'circle' in kerb ? <KerbCircle key={i} center={kerb.center} circle={kerb.circle} /> : <KerbOutline key={i} kerb={kerb.closed} />,
  );
}

function DirectionMarks({ picture: { arrows, posts, summits } }: { picture: PlanePicture }) {
  const { colors } = useTheme();
  return (
    <g>
      {arrows.map(({ point, angle }, i) => (
        <path
          key={i}
          d={arrowheadPath}
          fill={colors.ink}
          stroke={colors.paper}
          strokeWidth={1}
          transform={`translate(${round2(point.x)} ${round2(point.y)}) rotate(${round2(angle)})`}
        />
      ))}
      <path d={posts} stroke={colors.ink} strokeWidth={1.5} fill="none" />
      {summits.map(({ x, y }) => (
        <path key={x} d={`M${round2(x - 6)} ${round2(y + 4.5)}h12l-6 -10.5z`} fill={colors.ink} />
      ))}
    </g>
  );
}

function Worst({ worst }: { worst: NonNullable<PlanePicture['worst']> }) {
  const { colors } = useTheme();
  const { point, summit, leader } = worst;
  return (
    <g>
      <line x1={summit.x} y1={summit.y} x2={point.x} y2={point.y} stroke={colors.ink} strokeWidth={1.25} />
      {leader === null ? null : (
        <line x1={leader[0].x} y1={leader[0].y} x2={leader[1].x} y2={leader[1].y} stroke={colors.ink3} strokeWidth={1} />
      )}
      <circle cx={point.x} cy={point.y} r={5} fill={colors.ink} stroke={colors.paper} strokeWidth={1.5} />
    </g>
  );
}

/** Nyquist or Nichols without its cursor: contours, grid, other cases, kerbs, B, A, marks, labels, in that order. */
export const PlaneView = memo(function PlaneView({ picture }: { picture: PlanePicture }) {
  const clip = useId();
  const { plot, curves, worst, axisLabels, labels } = picture;
  return (
    <g>
      <defs>
        <clipPath id={clip}>
          <rect x={plot.x} y={plot.y} width={plot.width} height={plot.height} />
        </clipPath>
      </defs>
      <g clipPath={`url(#${clip})`}>
        <Ground picture={picture} />
        <CurvePath d={curves.others} kind="others" />
        <Kerbs kerbs={picture.kerbs} />
        <CurvePath d={curves.b} kind="b" />
        <CurvePath d={curves.a} kind="a" />
        <DirectionMarks picture={picture} />
        {worst === null ? null : <Worst worst={worst} />}
      </g>
      {axisLabels.map(({ x, y, text, anchor }) => (
        <ChartText key={text + x} x={x} y={y} anchor={anchor} halo>
          {text}
        </ChartText>
      ))}
      {labels.map((label, i) => (
        <ChartLabel key={i} label={label} />
      ))}
    </g>
  );
});
