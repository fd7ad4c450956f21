import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { VerdictWord } from '@/components/ui/verdict-word';
import type { Verdict } from '@/contract';
import { BasisMark } from './basis-mark';
import { bases, basisWords } from './basis-words';

const verdicts: readonly (readonly [Verdict, string])[] = [
  ['pass', 'target met'],
  ['tight', 'limit met, target missed'],
  ['fail', 'limit not met, or not stable'],
  ['notJudged', 'nothing can be said'],
];

/** What the shapes and discs in the cells mean. */
export function Legend() {
  return (
    <View role="group" aria-label="What the marks mean" style={styles.legend}>
      {verdicts.map(([verdict, meaning]) => (
        <View key={verdict} style={styles.entry}>
          <VerdictWord verdict={verdict} size={16} />
          <Text step="small" tone="ink2">
            {meaning}
          </Text>
        </View>
      ))}
      {bases.map((basis) => (
        <View key={basis} style={styles.entry}>
          <BasisMark basis={basis} />
          <Text step="small" weight={600}>
            {basisWords[basis].tag}
          </Text>
        </View>
      ))}
      <Text step="small" tone="ink2">
        In the grid no disc is extrapolated; a frame marks the case nearest the edge.
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  legend: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 18, rowGap: 4, alignItems: 'center', maxWidth: 480, flexShrink: 1 },
  entry: { flexDirection: 'row', alignItems: 'center', gap: 6 },
});
