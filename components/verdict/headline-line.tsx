import { StyleSheet, View } from 'react-native';
import type { Headline } from '@/contract';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { VerdictWord } from '@/components/ui/verdict-word';
import { headlineText } from './headline-text';

/** The headline in one line of a list: verdict, number, and what is demanded or why nobody judged. */
export function HeadlineLine({ headline }: { headline: Headline }) {
  const { quantity, value, limit, words } = headlineText(headline, useUnits());
  const aside = limit ?? (words ? null : headline.reason);
  return (
    <View style={styles.line}>
      <VerdictWord verdict={headline.verdict} />
      <Text step={words ? 'note' : 'h2'} tone={words ? 'ink2' : 'ink'} style={styles.value}>
        {[quantity, value].filter(Boolean).join(' ')}
      </Text>
      {aside ? (
        <Text step="note" tone="ink2" style={styles.value}>
          {aside}
        </Text>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: 10, rowGap: 2 },
  value: { flexShrink: 1 },
});
