import { memo } from 'react';
import { useTheme } from '@/components/ui/theme';
import { type FrequencyAxis, type Interval, round2, textWidth, type TimeAxis } from '@/figures';
import { ChartText } from './chart-text';

interface FootTick {
  x: number;
  text: string | null;
}

interface FootProps {
  ticks: readonly FootTick[];
  pixels: Interval;
  y: number;
  unit?: string;
}

/** The axis at the foot of a stack: long ticks with names, short ones between; names keep clear of the unit that ends the row. */
const FootAxis = memo(function FootAxis({ ticks, pixels: [left, right], y, unit = '' }: FootProps) {
  const { colors } = useTheme();
  const path = ticks.map(({ x, text }) => `M${round2(x)} ${y}v${text === null ? 4 : 7}`).join('');
  const free = right - (unit === '' ? -20 : textWidth(unit) + 8);
  const named = ticks.filter(({ x, text }) => text !== null && x + textWidth(text) / 2 <= free);
  return (
    <g>
      <path d={`M${left} ${y}H${right}${path}`} stroke={colors.rule2} strokeWidth={1} fill="none" />
      {named.map(({ x, text }) => {
        const atEnd = unit === '' && x > right - 8;
        return (
          <ChartText key={x} x={atEnd ? right : x} y={y + 20} anchor={atEnd ? 'end' : 'middle'}>
            {text ?? ''}
          </ChartText>
        );
      })}
      <ChartText x={right} y={y + 20} anchor="end">
        {unit}
      </ChartText>
    </g>
  );
});

export function FrequencyFoot({ axis, y }: { axis: FrequencyAxis; y: number }) {
  return (
    <FootAxis
      ticks={[...axis.labelled, ...axis.minor]}
      pixels={[axis.at(axis.domain[0]), axis.at(axis.domain[1])]}
      y={y}
      unit={axis.unit}
    />
  );
}

export function TimeFoot({ axis, y }: { axis: TimeAxis; y: number }) {
  return <FootAxis ticks={axis.ticks} pixels={[axis.at(axis.domain[0]), axis.at(axis.domain[1])]} y={y} />;
}
