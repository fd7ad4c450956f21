import { View } from 'react-native';
import { ColumnHeads } from '@/components/ui/column-heads';
import { Empty } from '@/components/ui/empty';
import { Paper } from '@/components/ui/paper';
import { useLayout } from '@/components/ui/use-layout';
import { COLUMN_GAP, columns, StackedLimitRow, WideLimitRow } from './limit-row';
import { useLimitsTable } from './limits-context';
import { type DemandRow, keyOf } from './model/demand-row';

export interface LimitListProps {
  rows: readonly DemandRow[];
  /** Something typed is not kept: where the analysis would stand, not where it stands. */
  changed: boolean;
}

/** Everything that is demanded; a table where it is wide enough. */
export function LimitList({ rows, changed }: LimitListProps) {
  const wide = useLayout() === 'wide';
  const { mayEdit, revision } = useLimitsTable();
  if (rows.length === 0) {
    const todo = mayEdit ? ' Start from a set, or add a quantity.' : '';
    return (
      <Paper>
        <Empty title="Nothing is demanded yet" text={`Without limits nothing is judged: no design can pass.${todo}`} />
      </Paper>
    );
  }
  const stands = revision ? `${revision} ${changed ? 'would stand' : 'stands'}` : '';
  const heads = [
    ['quantity', columns.quantity],
    ['must be', columns.bound],
    ['limit', columns.number],
    ['target', columns.number],
    ['where it comes from', columns.source],
    [stands, columns.standing],
    ...(mayEdit ? [['', columns.menu] as const] : []),
  ] as const;
  const Row = wide ? WideLimitRow : StackedLimitRow;
  return (
    <View style={{ zIndex: 1 }}>
      {wide ? <ColumnHeads gap={COLUMN_GAP} columns={heads} /> : null}
      <View role="list" aria-label="Limits">
        {rows.map((row, index) => (
          // The menu that drops out of a row lies over the rows below it.
          <View key={keyOf(row)} role="presentation" style={{ zIndex: rows.length - index }}>
            <Row row={row} />
          </View>
        ))}
      </View>
    </View>
  );
}
