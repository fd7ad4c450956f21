import { StyleSheet, View } from 'react-native';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { VerdictWord } from '@/components/ui/verdict-word';
import { checkValueText, demandText } from '@/components/verdict/demand-text';
import type { Check } from '@/contract';
import { demandedText, quantityName, type ReaderUnits } from '@/figures/quantity-text';

const targetText = ({ quantity, target }: Check, units: ReaderUnits) =>
  target === null ? 'no target' : `target ${demandedText(quantity, target, units)}`;

/** What is demanded of one case: its number, the demand and the verdict on it. */
export function CheckList({ checks, heading }: { checks: readonly Check[]; heading: string }) {
  return (
    <View style={styles.list}>
      <Heading level={2}>{heading}</Heading>
      <View role="table" aria-label={heading}>
        {checks.map((check) => (
          <CheckRow key={`${check.quantity} ${check.bound}`} check={check} />
        ))}
      </View>
    </View>
  );
}

function CheckRow({ check }: { check: Check }) {
  const { colors } = useTheme();
  const units = useUnits();
  return (
    <View role="row" style={[styles.row, { borderBottomColor: colors.rule }]}>
      <View role="rowheader" style={styles.name}>
        <Text>{quantityName(check.quantity)}</Text>
      </View>
      <View role="cell" style={styles.value}>
        <Text step="h3">{checkValueText(check, units)}</Text>
      </View>
      <View role="cell" style={styles.demand}>
        <Text step="note" tone="ink2">
          {`${demandText(check, units)}, ${targetText(check, units)}`}
        </Text>
      </View>
      <View role="cell" style={styles.verdict}>
        <VerdictWord verdict={check.verdict} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: 10 },
  row: { flexDirection: 'row', alignItems: 'center', minHeight: 40, gap: 10, paddingVertical: 4, borderBottomWidth: 1 },
  name: { flex: 4 },
  value: { flex: 3, alignItems: 'flex-end' },
  demand: { flex: 5 },
  verdict: { flex: 3 },
});
