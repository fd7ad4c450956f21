import { View } from 'react-native';
import { useTheme } from './theme';
import { line } from './tokens';

/** A line between things: a hairline between rows, `strong` between regions, `ink` under a head. */
export function Rule({ weight = 'hair' }: { weight?: 'hair' | 'strong' | 'ink' }) {
  const { colors } = useTheme();
  const color = { hair: colors.rule, strong: colors.rule2, ink: colors.ink }[weight];
  return <View style={{ height: weight === 'ink' ? line.head : line.hair, backgroundColor: color, alignSelf: 'stretch' }} />;
}
