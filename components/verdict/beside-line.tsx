import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { VerdictGlyph } from '@/components/ui/verdict-glyph';
import type { Headline } from '@/contract';
import { quantityName, quantityText } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';

type Beside = NonNullable<Headline['beside']>;

/** What stands beside the headline, never in its place: a failed performance quantity, or where the overall verdict comes from. */
export function BesideLine({ beside: { quantity, value, verdict, case: where } }: { beside: Beside }) {
  const units = useUnits();
  const number = value === null ? '' : ` ${quantityText(quantity, value, units).text}`;
  return (
    <View style={styles.line}>
      <VerdictGlyph verdict={verdict} size={16} />
      <Text step="note" weight={600} tone={verdict === 'notJudged' ? 'ink2' : verdict}>
        {verdictWords[verdict]}, {quantityName(quantity)}
        {number}
      </Text>
      <Text step="note" tone="ink2">
        {where.name}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({ line: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: 6 } });
