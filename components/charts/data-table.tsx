import { memo } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useFocusRing } from './use-focus-ring';

/** A chart's numbers as text, already in the reader's units. The first column names the row. */
export interface TableContent {
  caption: string;
  columns: readonly string[];
  rows: readonly (readonly string[])[];
}

const ROW = 30;

function Row({ cells, index }: { cells: readonly string[]; index: number }) {
  const { colors } = useTheme();
  return (
    <View role="row" style={[styles.row, { backgroundColor: index % 2 === 0 ? colors.bar : colors.paper }]}>
      {cells.map((cell, i) => (
        <View key={i} role={i === 0 ? 'rowheader' : 'cell'} style={styles.cell}>
          <Text step="small" weight={i === 0 ? 500 : 600} tone={i === 0 ? 'ink2' : 'ink'} style={styles.number}>
            {cell}
          </Text>
        </View>
      ))}
    </View>
  );
}

/** The numbers behind a chart, row by row, for those who read rather than look. */
export const DataTable = memo(function DataTable({ table, height }: { table: TableContent; height: number }) {
  const { style, ...focus } = useFocusRing();
  return (
    <ScrollView style={[{ height }, style]} tabIndex={0} role="region" aria-label={table.caption} {...focus}>
      <View role="table" aria-label={table.caption}>
        <View role="row" style={styles.row}>
          {table.columns.map((column) => (
            <View key={column} role="columnheader" style={styles.cell}>
              <Text step="small" tone="ink3" style={styles.number}>
                {column}
              </Text>
            </View>
          ))}
        </View>
        {table.rows.map((cells, i) => (
          <Row key={cells[0]} cells={cells} index={i} />
        ))}
      </View>
    </ScrollView>
  );
});

const styles = StyleSheet.create({
  row: { flexDirection: 'row', minHeight: ROW, alignItems: 'center', paddingHorizontal: 8 },
  cell: { flex: 1, paddingHorizontal: 4 },
  number: { textAlign: 'right' },
});
