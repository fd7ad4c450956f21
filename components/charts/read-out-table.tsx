import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { CurveSwatch } from './curve-key';

export interface ReadOutRow {
  design: 'a' | 'b';
  label: string;
  cells: readonly string[];
}

/** The values at the cursor, a row for each design. */
export function ReadOutTable({ place, columns, rows }: { place: string; columns: readonly string[]; rows: readonly ReadOutRow[] }) {
  const { colors } = useTheme();
  return (
    <View role="table" aria-label={`Values at ${place}`}>
      <View role="row" style={styles.row}>
        <View role="columnheader" style={styles.name}>
          <Text step="small" tone="ink2">{`at ${place}`}</Text>
        </View>
        {columns.map((column) => (
          <View key={column} role="columnheader" style={styles.cell}>
            <Text step="small" tone="ink2">
              {column}
            </Text>
          </View>
        ))}
      </View>
      {rows.map(({ design, label, cells }, i) => (
        <View key={design} role="row" style={[styles.row, i % 2 === 0 && { backgroundColor: colors.bar }]}>
          <View role="rowheader" style={styles.name}>
            <CurveSwatch design={design} />
            <Text step="small" tone={design === 'a' ? 'ink2' : 'b'} numberOfLines={1}>
              {label}
            </Text>
          </View>
          {cells.map((cell, k) => (
            <View key={k} role="cell" style={styles.cell}>
              <Text step="note" weight={600} tone={design === 'a' ? 'ink' : 'b'}>
                {cell}
              </Text>
            </View>
          ))}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', minHeight: 27, paddingHorizontal: 6 },
  name: { flex: 1.6, flexDirection: 'row', alignItems: 'center', gap: 16 },
  cell: { flex: 1, alignItems: 'flex-end' },
});
