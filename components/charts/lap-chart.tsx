import { memo, useId, useMemo } from 'react';
import { useTheme } from '@/components/ui/theme';
import { lapChart, type LapChartInput, type LapPicture, round2 } from '@/figures';
import { ChartShell } from './chart-shell';
import { ChartLabel, ChartText } from './chart-text';
import type { TableContent } from './data-table';
import { KerbStripe } from './kerb-stripe';
import { Layer } from './layer';
import { useChartFrame } from './use-chart-frame';

export interface LapChartProps extends Omit<LapChartInput, 'width'> {
  title: string;
  /** The unit of the number, and of the axis at the foot. */
  units: { number: string; foot: string };
  description: string;
  table: () => TableContent;
  /** Measured where absent. */
  width?: number;
}

const PENS = { strong: { width: 2.25, disc: 4.5 }, quiet: { width: 1.25, disc: 3 } };
const RING = 8;

function Ground({ picture: { plot, axis, columns, beyond }, foot }: { picture: LapPicture; foot: string }) {
  const { colors } = useTheme();
  const rows = axis.ticks.map(({ value }) => `M${plot.x} ${round2(axis.at(value))}h${plot.width}`);
  const uprights = columns.map(({ x }) => `M${round2(x)} ${plot.y}v${plot.height}`);
  const low = plot.y + plot.height;
  return (
    <g>
      {beyond.map((rect) => (
        <rect key={rect.x} {...rect} fill={colors.bar} />
      ))}
      <path d={[...rows, ...uprights].join('')} stroke={colors.rule} strokeWidth={1} fill="none" />
      <path d={`M${plot.x} ${low}h${plot.width}`} stroke={colors.rule2} strokeWidth={1} fill="none" />
      {axis.ticks.map(({ value, text }) => (
        <ChartText key={value} x={plot.x - 7} y={axis.at(value) + 4.5} anchor="end">
          {text}
        </ChartText>
      ))}
      {columns.map(({ x, text }) =>
        text === null ? null : (
          <ChartText key={x} x={x} y={low + 20} anchor="middle">
            {text}
          </ChartText>
        ),
      )}
      <ChartText x={plot.x + plot.width + 10} y={low + 20}>
        {foot}
      </ChartText>
    </g>
  );
}

function Lines({ picture: { plot, lines, worst } }: { picture: LapPicture }) {
  const { colors } = useTheme();
  const clip = useId();
  const inOrder = [...lines].sort((a, b) => Number(a.strong) - Number(b.strong));
  return (
    <g>
      <defs>
        <clipPath id={clip}>
          <rect x={plot.x} y={plot.y - 6} width={plot.width} height={plot.height + 12} />
        </clipPath>
      </defs>
      {inOrder.map(({ path, discs, strong }, i) => {
        const pen = strong ? PENS.strong : PENS.quiet;
        return (
          <g key={i}>
            <path d={path} fill="none" stroke={colors.ink} strokeWidth={pen.width} strokeLinejoin="round" clipPath={`url(#${clip})`} />
            {discs.map(({ x, y }) => (
              <circle key={x} cx={x} cy={y} r={pen.disc} fill={strong ? colors.ink : colors.paper} stroke={colors.ink} strokeWidth={1.25} />
            ))}
          </g>
        );
      })}
      {worst === null ? null : <circle cx={worst.x} cy={worst.y} r={RING} fill="none" stroke={colors.ink} strokeWidth={2} />}
    </g>
  );
}

/** One number over speed, one line per load: the limit as a kerb, the worst singled out, what was not checked barred. */
export const LapChart = memo(function LapChart(props: LapChartProps) {
  const { title, units, description, table, width: fixed, height, lines, demands, worst, beyond, tickText } = props;
  const { width, onLayout } = useChartFrame(fixed);
  const picture = useMemo(
    () => lapChart({ width, height, lines, demands, worst, beyond, tickText }),
    [width, height, lines, demands, worst, beyond, tickText],
  );
  const drawing = (
    <Layer width={width} height={height}>
      <Ground picture={picture} foot={units.foot} />
      {picture.kerbs.map((kerb, i) => (
        <KerbStripe key={i} kerb={kerb} />
      ))}
      <Lines picture={picture} />
      <ChartText x={picture.plot.x} y={picture.plot.y - 10} tone="title" unit={units.number}>
        {title}
      </ChartText>
      {picture.names.map(({ x, y, text, tone }) => (
        <ChartText key={text + tone} x={x} y={y} tone={tone}>
          {text}
        </ChartText>
      ))}
      {picture.labels.map((label, i) => (
        <ChartLabel key={i} label={label} />
      ))}
    </Layer>
  );
  return (
    <ChartShell
      name={title}
      description={description}
      height={height}
      onLayout={onLayout}
      picture={width > 0 ? drawing : null}
      overlay={null}
      table={table}
    />
  );
});
