import { useTheme } from '@/components/ui/theme';
import { textWidth, verdictShapes } from '@/figures';
import { ChartText } from './chart-text';

const GLYPH = 0.7;

/** Says on a picture that the loop is unstable and its margins mean nothing. Ends at `x`. */
export function UnstableMark({ x, y }: { x: number; y: number }) {
  const { colors } = useTheme();
  const text = 'unstable';
  const left = x - textWidth(text) - 18;
  return (
    <g>
      <path d={verdictShapes.fail.solid ?? ''} fill={colors.fail} transform={`translate(${left} ${y - 11}) scale(${GLYPH})`} />
      <ChartText x={x} y={y} anchor="end" tone="fail" halo>
        {text}
      </ChartText>
    </g>
  );
}
