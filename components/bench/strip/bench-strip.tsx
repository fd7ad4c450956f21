import { memo, useEffect, useRef, useSyncExternalStore } from 'react';
import { StyleSheet, View } from 'react-native';
import { useAnnounce } from '@/components/ui/announcements';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { VerdictStrip } from '@/components/verdict/verdict-strip';
import { useBench, useReading } from '../bench-context';
import { useRoom } from '../over/use-room';
import { spokenHeadline } from './strip-words';

/** The number first: the worst over all cases, its verdict and the room. It follows the gain and is said politely when it changes. */
export const BenchStrip = memo(function BenchStrip() {
  const { over } = useBench();
  const judged = useSyncExternalStore(over.subscribe, over.get);
  const shown = useReading();
  const room = useRoom();
  const problem = judged.problem ?? shown.problem;
  const { output } = judged;
  useSpoken(problem ?? (output && output.headline));
  if (output === null) return <View style={styles.waiting}>{problem !== null && <NoAnswer problem={problem} />}</View>;
  return (
    <>
      <VerdictStrip label="Verdict and margins" headline={output.headline} room={room} results={output.results} />
      {problem === null ? null : <Problem text={`${problem} The numbers and curves are those before it.`} />}
    </>
  );
});

/** Says what changed, but not what the bench opens with. */
function useSpoken(news: string | Parameters<typeof spokenHeadline>[0] | null): void {
  const announce = useAnnounce();
  const units = useUnits();
  const text = typeof news === 'string' || news === null ? news : spokenHeadline(news, units);
  const first = useRef(true);
  useEffect(() => {
    if (text === null) return;
    if (first.current) first.current = false;
    else announce(text);
  }, [text, announce]);
}

function Problem({ text }: { text: string }) {
  const { colors } = useTheme();
  return (
    <Text role="alert" step="note" tone="fail" style={[styles.problem, { backgroundColor: colors.paper }]}>
      {text}
    </Text>
  );
}

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
  problem: { paddingHorizontal: gutter.wide, paddingBottom: 8 },
});
