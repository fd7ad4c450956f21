import Svg, { Circle, Path } from 'react-native-svg';
import type { Verdict } from '@/contract';
import { useTheme } from './theme';

const quarter = 'M2 18C2 9 9 2 18 2v16z';
const rightHalf = 'M9.500 18V5C12 3 15 2 18 2v16z';
const bitten = 'M.8 19.200C.8 9 9 .8 19.200 .8v3.200h-3.600v4H19.200v3.800h-3.600v4h3.600v3.400z';

export interface VerdictGlyphProps {
  verdict: Verdict;
  size?: number;
  /** Where it stands on a block: the block's own text colour. */
  color?: string;
}

/**
 * One corner seen from above, its edge on the right: more ink, nearer the edge. Outline, half filled, solid with the kerb bitten in,
 * and a dashed ring for what nobody looked at. Always beside its word.
 */
export function VerdictGlyph({ verdict, size = 18, color }: VerdictGlyphProps) {
  const { colors } = useTheme();
  const ink = color ?? colors[verdict];
  const width = size < 17 ? 2.3 : 2;
  return (
    <Svg width={size} height={size} viewBox="0 0 20 20" aria-hidden>
      {verdict === 'fail' && <Path d={bitten} fill={ink} />}
      {(verdict === 'pass' || verdict === 'tight') && (
        <Path d={quarter} fill="none" stroke={ink} strokeWidth={width} strokeLinejoin="round" />
      )}
      {verdict === 'tight' && <Path d={rightHalf} fill={ink} />}
      {verdict === 'notJudged' && <Circle cx={10} cy={10} r={8} fill="none" stroke={ink} strokeWidth={width} strokeDasharray="3.1 3.183" />}
    </Svg>
  );
}
