import { memo, useMemo } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import type { Quantity } from '@/contract';
import { quantityName } from '@/figures/quantity-text';
import type { CaseGridLayout } from '../model/case-grid';
import type { CaseNumber } from '../model/case-number';
import { CaseCell } from './case-cell';
import { gridTable } from './grid-table';
import { cellLabel } from './grid-place';
import { useGridKeys } from './use-grid-keys';

export interface CaseGridProps {
  layout: CaseGridLayout;
  quantity: Quantity;
  numbers: ReadonlyMap<string, CaseNumber>;
  worst: CaseNumber | null;
  selected: string | undefined;
  onOpen: (caseId: string) => void;
}

/** Every case at its place: speed across and load down, on a phone the other way round. */
export const CaseGrid = memo(function CaseGrid({ layout, quantity, numbers, worst, selected, onOpen }: CaseGridProps) {
  const { colors } = useTheme();
  const units = useUnits();
  const phone = useLayout() === 'phone';
  const table = useMemo(() => gridTable(layout, { quantity, numbers, units, turned: phone }), [layout, quantity, numbers, units, phone]);
  const { filled, start } = useMemo(() => {
    const holds = table.rows.map(({ cells }) => cells.map(({ shown }) => shown !== null));
    const row = table.rows.findIndex(({ cells }) => cells.some(({ all }) => all.some(({ view }) => view.kept.id === selected)));
    const column = table.rows[row]?.cells.findIndex(({ all }) => all.some(({ view }) => view.kept.id === selected));
    const first = holds[0]?.indexOf(true) ?? 0;
    return { filled: holds, start: row < 0 ? { row: 0, column: Math.max(0, first) } : { row, column } };
  }, [table, selected]);
  const { grid, stop, setFocused, onKeyDown } = useGridKeys(filled, start);
  const headWidth = { width: phone ? 62 : 150 };
  const head = [styles.head, { backgroundColor: colors.paper, borderColor: colors.rule }];
  return (
    <ScrollView
      horizontal
      contentContainerStyle={styles.scroll}
      style={{ borderColor: colors.ink, borderTopWidth: 1.5, borderBottomWidth: 1.5 }}
    >
      <View
        ref={grid}
        role="grid"
        aria-label={`${quantityName(quantity)} of every case`}
        aria-rowcount={table.rows.length + 1}
        style={styles.grid}
        onKeyDown={onKeyDown}
      >
        <View role="row" aria-rowindex={1} style={styles.row}>
          <View role="columnheader" aria-colindex={1} style={[head, styles.corner, headWidth]}>
            <Text step="small" tone="ink2">
              {table.corner}
            </Text>
          </View>
          {table.columns.map(({ key, name }, column) => (
            <View key={key} role="columnheader" aria-colindex={column + 2} style={[head, styles.columnHead, { borderLeftWidth: 1 }]}>
              <Text step="small" weight={600} numberOfLines={2} style={styles.middle}>
                {name}
              </Text>
            </View>
          ))}
        </View>
        {table.rows.map(({ key, name, cells }, row) => (
          <View key={key} role="row" aria-rowindex={row + 2} style={[styles.row, styles.ruled, { borderTopColor: colors.rule }]}>
            <View role="rowheader" aria-colindex={1} style={[head, styles.rowHead, headWidth]}>
              <Text step="small" weight={600}>
                {name}
              </Text>
            </View>
            {cells.map(({ key: place, shown, all }, column) =>
              shown === null ? (
                <View
                  key={place}
                  role={'gridcell' as 'cell'}
                  aria-colindex={column + 2}
                  aria-label="no case here"
                  style={[styles.none, { borderColor: colors.rule }]}
                />
              ) : (
                <CaseCell
                  key={place}
                  number={shown}
                  more={all.length - 1}
                  worst={shown.view === worst?.view}
                  label={cellLabel(shown, quantity, shown.view === worst?.view)}
                  selected={all.some(({ view }) => view.kept.id === selected)}
                  stop={stop.row === row && stop.column === column}
                  column={column + 2}
                  onOpen={onOpen}
                  onFocus={() => setFocused({ row, column })}
                />
              ),
            )}
          </View>
        ))}
      </View>
    </ScrollView>
  );
});

const styles = StyleSheet.create({
  scroll: { flexGrow: 1 },
  grid: { flexGrow: 1 },
  row: { flexDirection: 'row' },
  ruled: { borderTopWidth: 1 },
  // A head stays where it is while the cells are pushed sideways under it.
  head: { justifyContent: 'center', paddingHorizontal: 6 },
  corner: { minHeight: 40, position: 'sticky' as 'absolute', left: 0, zIndex: 2 },
  rowHead: { position: 'sticky' as 'absolute', left: 0, zIndex: 2 },
  columnHead: { flex: 1, minWidth: 68 },
  middle: { textAlign: 'center' },
  none: { flex: 1, minWidth: 68, height: 50, borderLeftWidth: 1 },
});
