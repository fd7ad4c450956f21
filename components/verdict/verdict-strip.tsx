import { StyleSheet, View } from 'react-native';
import type { Headline } from '@/contract';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import { VerdictBlock } from '@/components/ui/verdict-block';
import { headlineText } from './headline-text';

export interface VerdictStripProps {
  headline: Headline;
  /** Over how many cases the number is the worst. */
  caseCount: number;
}

/** The number first: the worst over all cases, its case and frequency, and what is demanded of it or why nobody judged it. */
export function VerdictStrip({ headline, caseCount }: VerdictStripProps) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const text = headlineText(headline, useUnits());
  const worst = caseCount === 1 ? 'the only case' : `worst of ${caseCount}`;
  const unstable = headline.unstableCases > 0;
  const place = [worst, text.frequency].filter(Boolean).join(', ');
  return (
    <View
      role="region"
      aria-label="Worst margin over all cases"
      style={[styles.strip, phone ? styles.phone : styles.wide, { backgroundColor: colors.paper, borderBottomColor: colors.rule2 }]}
    >
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
  );
}

const styles = StyleSheet.create({
  strip: { flexDirection: 'row', alignItems: 'center', gap: 12, borderBottomWidth: 1 },
  phone: { paddingHorizontal: gutter.phone, paddingBottom: 10 },
  wide: { paddingHorizontal: gutter.wide, paddingVertical: 10 },
  text: { flex: 1, gap: 1 },
});
