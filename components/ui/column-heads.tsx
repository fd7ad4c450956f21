import { type StyleProp, StyleSheet, type TextStyle, View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';
import { gutter, line } from './tokens';

export interface ColumnHeadsProps {
  /** Name and width of each column, from the left. */
  columns: readonly (readonly [name: string, width: StyleProp<TextStyle>])[];
  /** Between columns, px: that of the rows below. */
  gap: number;
}

/** The names of the columns, over the rows of a wide list. */
export function ColumnHeads({ columns, gap }: ColumnHeadsProps) {
  const { colors } = useTheme();
  return (
    <View style={[styles.head, { gap, backgroundColor: colors.paper, borderBottomColor: colors.ink }]}>
      {columns.map(([name, width]) => (
        <Text key={name} step="small" tone="ink3" style={width}>
          {name}
        </Text>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', alignItems: 'center', height: 40, paddingHorizontal: gutter.wide, borderBottomWidth: line.head },
});
