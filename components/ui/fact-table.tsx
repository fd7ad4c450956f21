import { View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';

export interface Fact {
  name: string;
  value: string;
  /** The unit or the place of the number, set lighter. */
  aside?: string;
  /** A number that has no meaning here is struck out. */
  struck?: boolean;
}

/** Names and numbers, every second row barred. */
export function FactTable({ label, facts }: { label: string; facts: readonly Fact[] }) {
  const { colors } = useTheme();
  return (
    <View role="table" aria-label={label}>
      {facts.map(({ name, value, aside, struck }, i) => (
        <View
          key={name}
          role="row"
          style={{
            flexDirection: 'row',
            alignItems: 'center',
            minHeight: 36,
            gap: 10,
            paddingHorizontal: 8,
            paddingVertical: 4,
            backgroundColor: i % 2 === 0 ? colors.bar : colors.paper,
          }}
        >
          <View role="rowheader" style={{ flex: 4 }}>
            <Text>{name}</Text>
          </View>
          <View role="cell" style={{ flex: 3, alignItems: 'flex-end' }}>
            <Text step="h3" tone={struck ? 'ink3' : 'ink'} style={struck && { textDecorationLine: 'line-through' }}>
              {value}
            </Text>
          </View>
          <View role="cell" style={{ flex: 4 }}>
            <Text step="note" tone="ink2">
              {aside ?? ''}
            </Text>
          </View>
        </View>
      ))}
    </View>
  );
}
