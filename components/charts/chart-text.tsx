import { memo } from 'react';
import { fonts } from '@/components/ui/tokens';
import { useTheme } from '@/components/ui/theme';
import type { LabelTone, PanelLabel } from '@/figures';
import { textWidth } from '@/figures/text-width';

export type TextTone = LabelTone | 'tick' | 'title' | 'flag' | 'fail';

type Role = keyof ReturnType<typeof useTheme>['colors'];

const tones: Record<TextTone, { color: Role; weight: 500 | 600; size?: number }> = {
  tick: { color: 'ink3', weight: 500 },
  title: { color: 'ink', weight: 600 },
  strong: { color: 'ink', weight: 600 },
  quiet: { color: 'ink2', weight: 500 },
  limit: { color: 'fail', weight: 500 },
  fail: { color: 'fail', weight: 600 },
  b: { color: 'b', weight: 600 },
  struck: { color: 'ink3', weight: 600 },
  contour: { color: 'contourText', weight: 500, size: 12 },
  flag: { color: 'paper', weight: 600 },
};

export interface ChartTextProps {
  x: number;
  y: number;
  children: string;
  /** Follows the text, lighter. */
  unit?: string;
  tone?: TextTone;
  anchor?: 'start' | 'middle' | 'end';
  /** A rim of paper, so that the text reads over lines. */
  halo?: boolean;
}

/** A text of a picture. */
export const ChartText = memo(function ChartText({ x, y, children, unit, tone = 'tick', anchor = 'start', halo = false }: ChartTextProps) {
  const { colors } = useTheme();
  const { color, weight, size = 13 } = tones[tone];
  const rim = halo ? { stroke: colors.paper, strokeWidth: 4, strokeLinejoin: 'round' as const, paintOrder: 'stroke' } : {};
  return (
    <text x={x} y={y} fill={colors[color]} fontFamily={fonts.narrow[weight]} fontSize={size} textAnchor={anchor} {...rim}>
      {children}
      {unit === undefined ? null : (
        <tspan dx={7} fill={colors.ink3} fontFamily={fonts.narrow[500]}>
          {unit}
        </tspan>
      )}
    </text>
  );
});

const LINE_HEIGHT = 16;

/** A line through a number. A text decoration would be drawn in the halo's paper. */
function StrikeThrough({ label: { lines, place } }: { label: PanelLabel }) {
  const { colors } = useTheme();
  const width = textWidth(lines[0]);
  const left = place.x - { start: 0, middle: width / 2, end: width }[place.anchor];
  return <line x1={left - 2} x2={left + width + 2} y1={place.y - 4.5} y2={place.y - 4.5} stroke={colors.ink3} strokeWidth={1.5} />;
}

/** A placed label, line under line. Of a number without meaning only the number is struck out. */
export function ChartLabel({ label }: { label: PanelLabel }) {
  const { lines, place, tone } = label;
  const rest: TextTone = tone === 'struck' ? 'fail' : tone === 'strong' ? 'quiet' : tone;
  return (
    <>
      {lines.map((line, i) => (
        <ChartText key={i} x={place.x} y={place.y + i * LINE_HEIGHT} anchor={place.anchor} tone={i === 0 ? tone : rest} halo>
          {line}
        </ChartText>
      ))}
      {tone === 'struck' ? <StrikeThrough label={label} /> : null}
    </>
  );
}
