import { useTheme } from '@/components/ui/theme';
import { clamp, contains, type Interval, type Point, type Rect as Plot, textWidth } from '@/figures';
import { ChartText } from './chart-text';

/** The open disc of the cursor on a curve of A or B. */
export function CursorDisc({ at, design, radius = 4 }: { at: Point; design: 'a' | 'b'; radius?: number }) {
  const { colors } = useTheme();
  return <circle cx={at.x} cy={at.y} r={radius} fill={colors.paper} stroke={design === 'a' ? colors.ink : colors.b} strokeWidth={2} />;
}

/** The dotted line of the cursor through the panels of a stack. */
export function CursorLine({ x, plots }: { x: number; plots: readonly Plot[] }) {
  const { colors } = useTheme();
  return plots.map(({ y, height }) => (
    <line key={y} x1={x} x2={x} y1={y} y2={y + height} stroke={colors.ink} strokeWidth={1} strokeDasharray="1 3" strokeLinecap="round" />
  ));
}

/** The cursor's value on the axis at the foot. */
export function CursorFlag({ x, y, text, pixels }: { x: number; y: number; text: string; pixels: Interval }) {
  const { colors } = useTheme();
  const half = Math.max(20, textWidth(text) / 2 + 6);
  const middle = clamp(x, pixels[0] + half - 24, pixels[1] - half + 10);
  return (
    <g>
      <rect x={middle - half} y={y + 7} width={2 * half} height={18} rx={2} fill={colors.ink} />
      <ChartText x={middle} y={y + 20.5} tone="flag" anchor="middle">
        {text}
      </ChartText>
    </g>
  );
}

/** Discs that lie inside their panel, B under A. */
export function CursorDiscs({ a, b, plot }: { a: readonly Point[]; b: readonly Point[]; plot: Plot }) {
  const seen = (points: readonly Point[]) => points.filter((point) => contains(plot, point, -1));
  return (
    <g>
      {seen(b).map((at, i) => (
        <CursorDisc key={i} at={at} design="b" />
      ))}
      {seen(a).map((at, i) => (
        <CursorDisc key={i} at={at} design="a" />
      ))}
    </g>
  );
}
