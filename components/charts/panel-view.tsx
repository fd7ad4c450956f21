import { memo, useId } from 'react';
import { useTheme } from '@/components/ui/theme';
import { type PanelPicture, round2 } from '@/figures';
import { ChartLabel, ChartText } from './chart-text';
import { CurvePath } from './curve-path';
import { KerbStripe } from './kerb-stripe';

const TITLE_RISE = 6;
/** Round caps of a curve may reach this far beyond the panel. */
const OVERHANG = 1;

function Hairlines({ picture: { plot, axis, strong }, columns }: { picture: PanelPicture; columns: readonly number[] }) {
  const { colors } = useTheme();
  const row = (value: number) => `M${plot.x} ${round2(axis.at(value))}h${plot.width}`;
  const inView = (value: number) => value >= axis.domain[0] && value <= axis.domain[1];
  const rows = axis.ticks.filter(({ value }) => !strong.includes(value)).map(({ value }) => row(value));
  const uprights = columns.map((x) => `M${round2(x)} ${plot.y}v${plot.height}`);
  return (
    <g>
      <path d={[...rows, ...uprights].join('')} stroke={colors.rule} strokeWidth={1} fill="none" />
      <path d={strong.filter(inView).map(row).join('')} stroke={colors.rule2} strokeWidth={1} fill="none" />
    </g>
  );
}

function AxisNames({ picture: { plot, axis, title, unit } }: { picture: PanelPicture }) {
  return (
    <g>
      {axis.ticks.map(({ value, text }) => (
        <ChartText key={value} x={plot.x - 7} y={axis.at(value) + 4.5} anchor="end">
          {text}
        </ChartText>
      ))}
      <ChartText x={plot.x} y={plot.y - TITLE_RISE} tone="title" unit={unit}>
        {title}
      </ChartText>
    </g>
  );
}

/** One panel of a stack: grid, other cases, kerbs, B, A, marks, labels, in that order. `columns` are the upright hairlines. */
export const PanelView = memo(function PanelView({ picture, columns }: { picture: PanelPicture; columns: readonly number[] }) {
  const { colors } = useTheme();
  const clip = useId();
  const { plot, curves, kerbs, bars, dots, labels } = picture;
  return (
    <g>
      <defs>
        <clipPath id={clip}>
          <rect x={plot.x} y={plot.y - OVERHANG} width={plot.width} height={plot.height + 2 * OVERHANG} />
        </clipPath>
      </defs>
      <Hairlines picture={picture} columns={columns} />
      <AxisNames picture={picture} />
      <g clipPath={`url(#${clip})`}>
        <CurvePath d={curves.others} kind="others" />
        {kerbs.map((kerb, i) => (
          <KerbStripe key={i} kerb={kerb} />
        ))}
        <CurvePath d={curves.secondB} kind="secondB" />
        <CurvePath d={curves.b} kind="b" />
        <CurvePath d={curves.secondA} kind="secondA" />
        <CurvePath d={curves.a} kind="a" />
      </g>
      {bars.map(({ x, from, to, disc }, i) => (
        <g key={i}>
          <path d={`M${round2(x)} ${round2(from)}V${round2(to)}`} stroke={colors.ink} strokeWidth={1.5} fill="none" />
          {disc ? <circle cx={x} cy={to} r={3.5} fill={colors.ink} /> : null}
        </g>
      ))}
      {dots.map(({ x, y, radius }, i) => (
        <circle key={i} cx={x} cy={y} r={radius} fill={colors.ink} stroke={colors.paper} strokeWidth={1.5} />
      ))}
      {labels.map((label, i) => (
        <ChartLabel key={i} label={label} />
      ))}
    </g>
  );
});
