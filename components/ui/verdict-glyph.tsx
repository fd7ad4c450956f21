import Svg, { Circle, Path } from 'react-native-svg';
import type { Verdict } from '@/contract';
import { verdictShapes } from '@/figures/verdict-shape';
import { useTheme } from './theme';

const BOX = 20;
const SMALL = 17;

export interface VerdictGlyphProps {
  verdict: Verdict;
  size?: number;
  /** Where it stands on a block: the block's own text colour. */
  color?: string;
}

/** The verdict's shape, always beside its word. Small ones have a heavier outline. */
export function VerdictGlyph({ verdict, size = 18, color }: VerdictGlyphProps) {
  const { colors } = useTheme();
  const { outline, solid, ring } = verdictShapes[verdict];
  const ink = color ?? colors[verdict];
  const width = size < SMALL ? 2.3 : 2;
  return (
    <Svg width={size} height={size} viewBox={`0 0 ${BOX} ${BOX}`} aria-hidden>
      {outline && <Path d={outline} fill="none" stroke={ink} strokeWidth={width} strokeLinejoin="round" />}
      {solid && <Path d={solid} fill={ink} />}
      {ring && (
        <Circle
          cx={BOX / 2}
          cy={BOX / 2}
          r={ring.radius}
          fill="none"
          stroke={ink}
          strokeWidth={width}
          strokeDasharray={ring.dash.join(' ')}
        />
      )}
    </Svg>
  );
}
