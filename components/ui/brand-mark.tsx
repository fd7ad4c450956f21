import Svg, { Circle, Path } from 'react-native-svg';
import { useTheme } from './theme';

/** A kerb, the line taken past it, and where the car is. */
export function BrandMark({ size = 26 }: { size?: number }) {
  const { colors } = useTheme();
  return (
    <Svg width={size} height={size} viewBox="0 0 28 28" aria-hidden>
      <Path d="M4 4c0 11 9 20 20 20" fill="none" stroke={colors.ink} strokeWidth={3.2} />
      <Path d="M12 2c.5 7.500 6 13.500 14 14" fill="none" stroke={colors.ink} strokeWidth={1.6} />
      <Circle cx={16.6} cy={11.4} r={2.6} fill={colors.ink} />
    </Svg>
  );
}
