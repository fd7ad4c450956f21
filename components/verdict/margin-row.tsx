import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import type { MarginNumber } from './margin-numbers';

interface MarginRowProps {
  numbers: readonly MarginNumber[];
  /** Struck out: they have no meaning. */
  unstable: boolean;
  /** On a phone the numbers share the line, and where they were found is left to the charts. */
  compact: boolean;
}

/** Ms and the margins side by side. */
export function MarginRow({ numbers, unstable, compact }: MarginRowProps) {
  return (
    <View style={[styles.row, compact ? styles.compact : styles.wide]}>
      {numbers.map(({ quantity, name, value, place }) => (
        <View
          key={quantity}
          style={compact ? styles.cell : styles.column}
          accessible
          aria-label={unstable ? `${name} ${value}, no meaning while unstable` : `${name} ${value} ${place}`}
        >
          <Text step={compact ? 'tick' : 'small'} tone="ink2" numberOfLines={1}>
            {name}
          </Text>
          <Text
            step="value"
            style={[compact && styles.small, unstable && styles.struck]}
            tone={unstable ? 'ink3' : 'ink'}
            numberOfLines={1}
          >
            {value}
          </Text>
          {compact ? null : (
            <Text step="tick" tone="ink2" numberOfLines={1}>
              {unstable ? 'no meaning' : place}
            </Text>
          )}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row' },
  compact: { justifyContent: 'space-between', gap: 8 },
  wide: { gap: 26 },
  cell: { gap: 1 },
  column: { gap: 3, minWidth: 96 },
  small: { fontSize: 18, lineHeight: 20 },
  struck: { textDecorationLine: 'line-through' },
});
