import { memo, useMemo } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { worstVerdict } from '@/analysis/project';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { demandText } from '@/components/verdict/demand-text';
import type { Limit, Quantity } from '@/contract';
import { quantityName } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';
import type { CaseGridLayout } from '../model/case-grid';
import { caseNumber } from '../model/case-number';
import type { CaseView } from '../model/case-view';
import { worstNumber } from '../model/worst-number';
import { CellFace } from './case-cell';
import { gridTable } from './grid-table';

export interface MiniGridProps {
  layout: CaseGridLayout;
  views: readonly CaseView[];
  quantity: Quantity;
  limits: readonly Limit[];
  onChoose: (quantity: Quantity) => void;
}

/** Another number over the same cases, to be seen beside the one that is chosen; pressing it chooses it. */
export const MiniGrid = memo(function MiniGrid({ layout, views, quantity, limits, onChoose }: MiniGridProps) {
  const { colors } = useTheme();
  const units = useUnits();
  const { table, worst, verdict } = useMemo(() => {
    const numbers = views.map((view) => caseNumber(view, quantity, units));
    const verdicts = numbers.flatMap((number) => number.verdict ?? []);
    const byId = new Map(numbers.map((number) => [number.view.kept.id, number]));
    return {
      table: gridTable(layout, { quantity, numbers: byId, units, turned: false }),
      worst: worstNumber(numbers, quantity),
      verdict: verdicts.length === 0 ? null : worstVerdict(verdicts),
    };
  }, [layout, views, quantity, units]);
  const demands = limits.filter((limit) => limit.quantity === quantity).map((limit) => demandText(limit, units));
  const demand = demands.join(', ') || 'no limit set';
  const said = [
    quantityName(quantity),
    demand,
    worst && `worst ${worst.text} in ${worst.view.kept.name}`,
    verdict && verdictWords[verdict],
  ];
  return (
    <Pressable role="button" aria-label={`Show ${said.filter(Boolean).join(', ')}`} onPress={() => onChoose(quantity)} style={styles.box}>
      <View style={styles.head}>
        <Text weight={600}>{quantityName(quantity)}</Text>
        <Text step="small" tone="ink2">
          {demand}
        </Text>
      </View>
      <View style={[styles.grid, { borderColor: colors.ink }]} aria-hidden>
        {table.rows.map(({ key, cells }, row) => (
          <View key={key} style={[styles.row, row > 0 && { borderTopWidth: 1, borderTopColor: colors.rule }]}>
            {cells.map(({ key: place, shown }, column) => (
              <View key={place} style={[styles.cell, column > 0 && { borderLeftWidth: 1, borderLeftColor: colors.rule }]}>
                {shown ? <CellFace number={shown} worst={shown.view === worst?.view} small /> : null}
              </View>
            ))}
          </View>
        ))}
      </View>
    </Pressable>
  );
});

const styles = StyleSheet.create({
  box: { flexGrow: 1, flexBasis: 250, minWidth: 0, gap: 5 },
  head: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'baseline', gap: 8 },
  grid: { borderTopWidth: 1.5, borderBottomWidth: 1.5 },
  row: { flexDirection: 'row', height: 33 },
  cell: { flex: 1, minWidth: 0, overflow: 'hidden' },
});
