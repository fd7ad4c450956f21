import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { VerdictWord } from '@/components/ui/verdict-word';
import { checkValueText, demandText } from '@/components/verdict/demand-text';
import type { Check } from '@/contract';
import { demandedText, quantityName } from '@/figures/quantity-text';
import { verdictOf } from '../model/case-number';
import type { CaseView } from '../model/case-view';

/** Every check of a case: the number, what is demanded of it, and what it is worth. */
export function CheckTable({ view }: { view: CaseView }) {
  const checks = view.result?.checks ?? [];
  const unstable = view.result?.numbers.closedLoop.stable === false;
  return (
    <View role="table" aria-label={`Checks of ${view.kept.name}`}>
      <View role="row" style={styles.heads}>
        {['number', 'value', 'demanded', 'verdict'].map((name) => (
          <View key={name} role="columnheader">
            <Text>{name}</Text>
          </View>
        ))}
      </View>
      {checks.map((check, index) => (
        <CheckLine key={`${check.quantity} ${check.bound}`} check={check} view={view} unstable={unstable} barred={index % 2 === 0} />
      ))}
    </View>
  );
}

interface CheckLineProps {
  check: Check;
  view: CaseView;
  unstable: boolean;
  barred: boolean;
}

function CheckLine({ check, view, unstable, barred }: CheckLineProps) {
  const { colors } = useTheme();
  const units = useUnits();
  const target = check.target === null ? 'no target' : `target ${demandedText(check.quantity, check.target, units)}`;
  return (
    <View role="row" style={[styles.row, { backgroundColor: barred ? colors.bar : colors.paper }]}>
      <View role="rowheader" style={styles.name}>
        <Text>{quantityName(check.quantity)}</Text>
      </View>
      <View role="cell" style={styles.value}>
        <Text step="h3" tone={unstable || view.outdated ? 'ink3' : 'ink'} style={unstable && styles.struck} numberOfLines={1}>
          {checkValueText(check, units)}
        </Text>
      </View>
      <View role="cell" style={styles.demand}>
        <Text step="small" tone="ink2">
          {demandText(check, units)}, {target}
        </Text>
      </View>
      <View role="cell" style={styles.verdict}>
        <VerdictWord verdict={verdictOf(view, check)} size={17} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  // For those who listen: the eye reads the columns by what stands in them.
  heads: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 },
  row: { flexDirection: 'row', alignItems: 'center', minHeight: 36, gap: 8, paddingHorizontal: 8, paddingVertical: 4 },
  name: { flex: 4, minWidth: 0 },
  value: { minWidth: 66, alignItems: 'flex-end' },
  demand: { flex: 5, minWidth: 0, paddingLeft: 6 },
  verdict: { minWidth: 76, alignItems: 'flex-start' },
  struck: { textDecorationLine: 'line-through' },
});
