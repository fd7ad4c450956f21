import { memo, useEffect, useMemo, useRef } from 'react';
import { StyleSheet, View } from 'react-native';
import { useAnnounce } from '@/components/ui/announcements';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter, line } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import { VerdictBlock } from '@/components/ui/verdict-block';
import { marginNumbers } from '@/components/verdict/margin-numbers';
import { MarginRow } from '@/components/verdict/margin-row';
import { useBench, useReading } from '../bench-context';
import { judged } from '../live/judged';
import { stripWords } from './strip-words';

/** The number first: verdict, the case that it comes from, Ms and the margins. It follows the gain and is said politely when it changes. */
export const BenchStrip = memo(function BenchStrip() {
  const { colors } = useTheme();
  const units = useUnits();
  const announce = useAnnounce();
  const phone = useLayout() === 'phone';
  const { subject } = useBench();
  const { output, input, problem } = useReading();
  const headline = useMemo(() => (output && input ? judged(subject, input.settings, output.analysis) : null), [subject, input, output]);
  const words = useMemo(() => (headline && output ? stripWords(headline, output.analysis, units) : null), [headline, output, units]);
  const spoken = problem ?? words?.spoken ?? null;
  const first = useRef(true);
  useEffect(() => {
    if (spoken === null) return;
    if (first.current) first.current = false;
    else announce(spoken);
  }, [spoken, announce]);
  if (!output || !headline || !words) return <View style={styles.waiting}>{problem !== null && <NoAnswer problem={problem} />}</View>;
  const { stable } = output.analysis.closedLoop;
  const { quantity, value, words: inWords } = words.headline;
  return (
    <View
      role="region"
      aria-label="Verdict and margins"
      style={[
        phone ? styles.phone : styles.wide,
        { backgroundColor: colors.paper, borderBottomColor: phone ? colors.paper : colors.rule2 },
      ]}
    >
      <View style={styles.head}>
        <View style={styles.block}>
          <VerdictBlock verdict={headline.verdict} quantity={quantity ?? undefined} value={value} words={inWords} />
        </View>
        <View style={styles.about}>
          <Text step="note" weight={600} numberOfLines={1}>
            {phone ? `${subject.shownCase.name}, ${subject.plant.name}` : subject.shownCase.name}
          </Text>
          {words.lines.map((text) => (
            <Text key={text} step={phone ? 'small' : 'note'} tone="ink2" numberOfLines={2}>
              {text}
            </Text>
          ))}
        </View>
      </View>
      {problem === null ? (
        <MarginRow numbers={marginNumbers(output.analysis, units)} unstable={!stable} compact={phone} />
      ) : (
        <Text role="alert" step="note" tone="fail" style={styles.problem}>
          {problem} The curves are those before it.
        </Text>
      )}
    </View>
  );
});

/** These gains have no answer, and there is none before them to look at. */
function NoAnswer({ problem }: { problem: string }) {
  return (
    <View role="alert" style={styles.noAnswer}>
      <Heading level={2}>No curves for these gains</Heading>
      <Text tone="fail">{problem} Move a gain to go on.</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  noAnswer: { paddingHorizontal: gutter.wide, paddingVertical: 16, gap: 4 },
  waiting: { minHeight: 104 },
  phone: { paddingHorizontal: gutter.phone, paddingBottom: 8, gap: 8 },
  wide: {
    flexDirection: 'row',
    alignItems: 'center',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    columnGap: 34,
    rowGap: 8,
    minHeight: 84,
    paddingHorizontal: gutter.wide,
    paddingVertical: 8,
    borderBottomWidth: line.hair,
  },
  head: { flexDirection: 'row', alignItems: 'center', gap: 12 },
  block: { flexShrink: 0 },
  about: { flexShrink: 1, gap: 1 },
  problem: { flexShrink: 1 },
});
