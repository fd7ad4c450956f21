import { StyleSheet, View } from 'react-native';
import { EdgeRuler } from '@/components/charts/edge-ruler';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { VerdictWord } from '@/components/ui/verdict-word';
import { checkValueText, demandText } from '@/components/verdict/demand-text';
import type { WorstCheck } from '@/components/verdict/worst-checks';
import { quantityName } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';

export interface StandingProps {
  /** Where it stands; absent while that is not known. */
  worst?: WorstCheck;
  /** "rev 7" */
  revision: string;
}

/** Where the newest analysis stands to a demand, on one line of a phone's row. */
export function ShortStanding({ worst, revision }: StandingProps) {
  const units = useUnits();
  if (!worst) return null;
  return (
    <View style={styles.short}>
      <Text step="note" weight={600}>{`${revision}: ${checkValueText(worst.check, units)}`}</Text>
      <VerdictWord verdict={worst.check.verdict} size={16} />
    </View>
  );
}

/** The same with all cases on the edge ruler, in the last columns of a wide row. */
export function Standing({ worst, revision }: StandingProps) {
  const units = useUnits();
  if (!worst) return <View style={styles.wide} />;
  const { check, uses, case: where } = worst;
  const value = checkValueText(check, units);
  const said = `${revision}: ${quantityName(check.quantity)} ${value}, ${demandText(check, units)}, ${verdictWords[check.verdict]}, worst in ${where.name}`;
  return (
    <View style={styles.wide}>
      <View style={styles.value}>
        <Text weight={600} numberOfLines={1}>
          {value}
        </Text>
        <Text step="tick" tone="ink2" numberOfLines={1}>
          {where.name}
        </Text>
      </View>
      <EdgeRuler uses={uses} worst={check.use} hasTarget={check.target !== null} label={said} width={RULER} />
      <View style={styles.verdict}>
        <VerdictWord verdict={check.verdict} />
      </View>
    </View>
  );
}

const RULER = 170;
const GAP = 12;
const VALUE = 96;
const VERDICT = 92;
/** Of the last columns together, px. */
export const STANDING_WIDTH = VALUE + RULER + VERDICT + 2 * GAP;

const styles = StyleSheet.create({
  short: { flexDirection: 'row', alignItems: 'center', gap: 8 },
  wide: { width: STANDING_WIDTH, flexDirection: 'row', alignItems: 'center', gap: GAP },
  value: { width: VALUE, gap: 1 },
  verdict: { width: VERDICT },
});
