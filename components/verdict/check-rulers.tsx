import { StyleSheet, View } from 'react-native';
import { EdgeRuler } from '@/components/charts/edge-ruler';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { VerdictGlyph } from '@/components/ui/verdict-glyph';
import { quantityName } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';
import { checkValueText, demandSign, demandText } from './demand-text';
import type { WorstCheck } from './worst-checks';

const WIDTH = 116;

/** What is demanded side by side: the worst over all cases, its limit, and all cases on the edge ruler. */
export function CheckRulers({ checks }: { checks: readonly WorstCheck[] }) {
  return (
    <View style={styles.row}>
      {checks.map((worst) => (
        <CheckRuler key={`${worst.check.quantity} ${worst.check.bound}`} worst={worst} />
      ))}
    </View>
  );
}

function CheckRuler({ worst: { check, case: where, uses } }: { worst: WorstCheck }) {
  const units = useUnits();
  const name = quantityName(check.quantity);
  const value = checkValueText(check, units);
  const said = `${name} ${value}, ${demandText(check, units)}, ${verdictWords[check.verdict]}, worst in ${where.name}`;
  return (
    <View style={styles.ruler}>
      <View style={styles.head}>
        <Text step="small" tone="ink2" numberOfLines={1} style={styles.name}>
          {name}
        </Text>
        <VerdictGlyph verdict={check.verdict} size={16} />
      </View>
      <Text step="value" style={styles.value} numberOfLines={1}>
        {value}{' '}
        <Text step="small" tone="ink2">
          {demandSign(check, units)}
        </Text>
      </Text>
      <EdgeRuler uses={uses} worst={check.use} hasTarget={check.target !== null} label={said} width={WIDTH} />
      <Text step="tick" tone="ink2" numberOfLines={1}>
        {where.name}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 14, rowGap: 6 },
  ruler: { width: WIDTH, gap: 1 },
  head: { flexDirection: 'row', alignItems: 'center', gap: 6 },
  name: { flexShrink: 1, flexGrow: 1 },
  value: { fontSize: 18, lineHeight: 20 },
});
