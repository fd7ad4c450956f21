import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { quantityName } from '@/figures/quantity-text';
import { useLimitsTable } from './limits-context';
import type { DemandRow } from './model/demand-row';
import { boundWords, longName, rowWords } from './model/row-words';
import { RowMenu } from './row-menu';
import { NumberCell, ReadNumber, RowProblems, SourceCell } from './row-fields';
import { ShortStanding, Standing, STANDING_WIDTH } from './standing';

/** One demand in two lines: what it is and where the newest analysis stands, then its fields. */
export function StackedLimitRow({ row }: { row: DemandRow }) {
  const { colors } = useTheme();
  const units = useUnits();
  const { mayEdit, revision, standingOf } = useLimitsTable();
  return (
    <View role="listitem" style={[styles.stacked, { backgroundColor: colors.paper, borderBottomColor: colors.rule2 }]}>
      <View style={styles.head}>
        <Text step="h3" style={styles.name}>
          {quantityName(row.quantity)}
        </Text>
        {revision ? <ShortStanding worst={standingOf(row)} revision={revision} /> : null}
        {mayEdit ? <RowMenu row={row} /> : null}
      </View>
      {mayEdit ? (
        <View style={styles.line}>
          <Text step="note" tone="ink2">
            {boundWords[row.bound]}
          </Text>
          <NumberCell row={row} field="limit" />
          <Text step="note" tone="ink2">
            target
          </Text>
          <NumberCell row={row} field="target" />
          <View style={styles.source}>
            <SourceCell row={row} />
          </View>
        </View>
      ) : (
        <Text tone="ink2">{rowWords(row, units)}</Text>
      )}
      <RowProblems row={row} />
    </View>
  );
}

/** One demand as a row of the wide table. */
export function WideLimitRow({ row }: { row: DemandRow }) {
  const { colors } = useTheme();
  const { mayEdit, revision, standingOf } = useLimitsTable();
  const Cell = mayEdit ? NumberCell : ReadNumber;
  return (
    <View role="listitem" style={[styles.wideRow, { backgroundColor: colors.paper, borderBottomColor: colors.rule }]}>
      <View style={styles.wide}>
        <Text step="h3" style={columns.quantity}>
          {longName(row.quantity)}
        </Text>
        <Text style={columns.bound}>{boundWords[row.bound]}</Text>
        <View style={columns.number}>
          <Cell row={row} field="limit" />
        </View>
        <View style={columns.number}>
          <Cell row={row} field="target" />
        </View>
        <View style={columns.source}>{mayEdit ? <SourceCell row={row} /> : <Text>{row.source || '–'}</Text>}</View>
        {revision ? <Standing worst={standingOf(row)} revision={revision} /> : <View style={columns.standing} />}
        {mayEdit ? <RowMenu row={row} /> : null}
      </View>
      <RowProblems row={row} />
    </View>
  );
}

export const COLUMN_GAP = 16;

export const columns = StyleSheet.create({
  quantity: { flex: 1, minWidth: 150 },
  bound: { width: 64 },
  number: { width: 108 },
  source: { width: 168 },
  standing: { width: STANDING_WIDTH },
  menu: { width: 48 },
});

const styles = StyleSheet.create({
  stacked: { borderBottomWidth: 1, paddingHorizontal: gutter.phone, paddingVertical: 6, gap: 6 },
  head: { flexDirection: 'row', alignItems: 'center', gap: 8, minHeight: 48 },
  name: { flex: 1, minWidth: 0 },
  line: { flexDirection: 'row', alignItems: 'center', gap: 8, paddingBottom: 6 },
  source: { flex: 1, minWidth: 0 },
  wideRow: { borderBottomWidth: 1, paddingHorizontal: gutter.wide, paddingVertical: 5, gap: 4 },
  wide: { flexDirection: 'row', alignItems: 'center', gap: COLUMN_GAP, minHeight: 46 },
});
