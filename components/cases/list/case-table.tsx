import { memo } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { VerdictGlyph } from '@/components/ui/verdict-glyph';
import { VerdictWord } from '@/components/ui/verdict-word';
import type { Quantity } from '@/contract';
import { verdictWords } from '@/figures/verdict-shape';
import { BasisMark } from '../basis-mark';
import { basisWords } from '../basis-words';
import type { ListPlace } from './case-row';
import type { ListRow, ListSort } from './list-sort';
import { SortHead } from './sort-head';

interface CaseTableProps extends ListPlace {
  rows: readonly ListRow[];
  columns: readonly Quantity[];
  sort: ListSort;
  onSort: (sort: ListSort) => void;
}

/** The wide list: a row a case, a column a check, sorted by the head that is pressed. */
export function CaseTable({ rows, columns, sort, onSort, ...place }: CaseTableProps) {
  const { colors } = useTheme();
  const head = { sort, onSort };
  return (
    <View role="table" aria-label="Cases">
      <View role="row" style={[styles.heads, { borderBottomColor: colors.ink }]}>
        <SortHead {...head} by="name" name="case" style={styles.name} />
        {columns.map((quantity) => (
          <SortHead key={quantity} {...head} by={quantity} style={styles.number} />
        ))}
        <SortHead {...head} by="verdict" name="verdict" style={styles.verdict} />
      </View>
      {rows.map((row, index) => (
        <TableRow key={row.view.kept.id} row={row} barred={index % 2 === 1} {...place} />
      ))}
    </View>
  );
}

interface TableRowProps extends ListPlace {
  row: ListRow;
  barred: boolean;
}

const TableRow = memo(function TableRow({ row: { view, verdict, numbers }, barred, worst, selected, onOpen }: TableRowProps) {
  const { colors } = useTheme();
  const { id, name, basis } = view.kept;
  const isWorst = id === worst;
  const edge = isWorst || id === selected ? colors.ink : 'transparent';
  return (
    <View role="row" style={[styles.row, { backgroundColor: barred ? colors.bar : colors.paper, borderLeftColor: edge }]}>
      <View role="rowheader" style={styles.name}>
        <Pressable
          role="button"
          aria-label={`${name}, ${basisWords[basis].tag}${isWorst ? ', nearest the edge of all' : ''}`}
          aria-current={id === selected ? 'true' : undefined}
          onPress={() => onOpen(id)}
          style={styles.open}
        >
          <BasisMark basis={basis} />
          <Text weight={isWorst || id === selected ? 700 : 600} numberOfLines={1} style={styles.text}>
            {name}
          </Text>
        </Pressable>
      </View>
      {numbers.map((number, i) => (
        <View key={i} role="cell" style={[styles.number, styles.cell]}>
          <Text weight={600} tone={view.outdated ? 'ink3' : 'ink'} numberOfLines={1}>
            {number.text}
          </Text>
          {number.verdict ? (
            <View role="img" aria-label={verdictWords[number.verdict]}>
              <VerdictGlyph verdict={number.verdict} size={16} />
            </View>
          ) : null}
        </View>
      ))}
      <View role="cell" style={styles.verdict}>
        <VerdictWord verdict={verdict} />
      </View>
    </View>
  );
});

const styles = StyleSheet.create({
  heads: { flexDirection: 'row', borderBottomWidth: 1.5, paddingLeft: 4 },
  row: { flexDirection: 'row', alignItems: 'center', minHeight: 44, borderLeftWidth: 4 },
  name: { flex: 3, minWidth: 150 },
  open: { flexDirection: 'row', alignItems: 'center', gap: 8, minHeight: 44, paddingHorizontal: 8 },
  text: { flexShrink: 1 },
  number: { flex: 2, minWidth: 0, paddingHorizontal: 4 },
  cell: { flexDirection: 'row', alignItems: 'center', justifyContent: 'flex-end', gap: 6 },
  verdict: { flex: 2, minWidth: 106, paddingLeft: 16 },
});
