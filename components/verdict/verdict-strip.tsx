import { StyleSheet, View } from 'react-native';
import type { Analysis, Headline } from '@/contract';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import { VerdictBlock } from '@/components/ui/verdict-block';
import { headlineText } from './headline-text';
import { marginNumbers } from './margin-numbers';
import { MarginRow } from './margin-row';

export interface VerdictStripProps {
  headline: Headline;
  /** Over how many cases the number is the worst. */
  caseCount: number;
  /** The numbers of the case that the headline comes from. */
  numbers: Analysis;
}

/** The number first: the worst over all cases, its case and frequency, what is demanded of it or why nobody judged it; beside it the case's margins. */
export function VerdictStrip({ headline, caseCount, numbers }: VerdictStripProps) {
  const { colors } = useTheme();
  const units = useUnits();
  const phone = useLayout() === 'phone';
  const text = headlineText(headline, units);
  const worst = caseCount === 1 ? 'the only case' : `worst of ${caseCount}`;
  const unstable = headline.unstableCases > 0;
  const place = [worst, text.frequency].filter(Boolean).join(', ');
  return (
    <View
      role="region"
      aria-label="Worst margin over all cases"
      style={[styles.strip, phone ? styles.phone : styles.wide, { backgroundColor: colors.paper, borderBottomColor: colors.rule2 }]}
    >
      <View style={styles.head}>
        <VerdictBlock verdict={headline.verdict} quantity={text.quantity ?? undefined} value={text.value} words={text.words} />
        <View style={styles.text}>
          {headline.case && (
            <Text step="note" weight={600}>
              {headline.case.name}
            </Text>
          )}
          <Text step="note" tone="ink2">
            {unstable ? `unstable in ${headline.unstableCases} of ${caseCount}. Margins have no meaning there.` : place}
          </Text>
          {text.limit || (headline.reason && !text.words) ? (
            <Text step="small" tone="ink2">
              {text.limit ?? headline.reason}
            </Text>
          ) : null}
        </View>
      </View>
      <MarginRow numbers={marginNumbers(numbers, units)} unstable={!numbers.closedLoop.stable} compact={phone} />
    </View>
  );
}

const styles = StyleSheet.create({
  strip: { borderBottomWidth: 1 },
  phone: { paddingHorizontal: gutter.phone, paddingBottom: 10, gap: 8 },
  wide: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    columnGap: 34,
    rowGap: 8,
    minHeight: 84,
    paddingHorizontal: gutter.wide,
    paddingVertical: 8,
  },
  head: { flexDirection: 'row', alignItems: 'center', gap: 12, flexShrink: 1 },
  text: { flexShrink: 1, gap: 1 },
});
