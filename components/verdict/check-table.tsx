import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { VerdictWord } from '@/components/ui/verdict-word';
import type { Check } from '@/contract';
import { demandedText, quantityName } from '@/figures/quantity-text';
import { checkValueText, demandText } from './demand-text';

export interface CheckTableProps {
  label: string;
  checks: readonly Check[];
  /** The numbers have no meaning: struck out. */
  unstable?: boolean;
  /** The numbers are those of before: set lighter. */
  outdated?: boolean;
}

/** Every check of a case: the number, what is demanded of it, and what it is worth. */
export function CheckTable({ label, checks, unstable = false, outdated = false }: CheckTableProps) {
  return (
    <View role="table" aria-label={label}>
      <View role="row" style={styles.heads}>
        {['number', 'value', 'demanded', 'verdict'].map((name) => (
          <View key={name} role="columnheader">
            <Text>{name}</Text>
          </View>
        ))}
      </View>
      {checks.map((check, index) => (
        <CheckLine
          key={`${check.quantity} ${check.bound}`}
          check={check}
          unstable={unstable}
          outdated={outdated}
          barred={index % 2 === 0}
        />
      ))}
    </View>
  );
}

type CheckLineProps = Pick<Required<CheckTableProps>, 'unstable' | 'outdated'> & { check: Check; barred: boolean };

function CheckLine({ check, unstable, outdated, barred }: CheckLineProps) {
  const { colors } = useTheme();
  const units = useUnits();
  const target = check.target === null ? 'no target' : `target ${demandedText(check.quantity, check.target, units)}`;
  return (
    <View role="row" style={[styles.row, { backgroundColor: barred ? colors.bar : colors.paper }]}>
      <View role="rowheader" style={styles.name}>
        <Text>{quantityName(check.quantity)}</Text>
      </View>
      <View role="cell" style={styles.value}>
        <Text step="h3" tone={unstable || outdated ? 'ink3' : 'ink'} style={unstable && styles.struck} numberOfLines={1}>
          {checkValueText(check, units)}
        </Text>
      </View>
      <View role="cell" style={styles.demand}>
        <Text step="small" tone="ink2">
          {demandText(check, units)}, {target}
        </Text>
      </View>
      <View role="cell" style={styles.verdict}>
        <VerdictWord verdict={check.verdict} size={17} />
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
