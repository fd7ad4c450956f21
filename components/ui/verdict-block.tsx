import { StyleSheet, View } from 'react-native';
import type { Verdict } from '@/contract';
import { verdictWords } from '@/figures/verdict-shape';
import { Text } from './text';
import { useTheme } from './theme';
import { corner, type Palette } from './tokens';
import { VerdictGlyph } from './verdict-glyph';

const looks = (colors: Palette): Record<Verdict, { fill: string; edge: string; text: keyof Palette }> => ({
  pass: { fill: colors.paper, edge: colors.pass, text: 'pass' },
  tight: { fill: colors.tightFill, edge: colors.tightEdge, text: 'onTight' },
  fail: { fill: colors.failFill, edge: colors.failFill, text: 'onFail' },
  notJudged: { fill: colors.paper, edge: colors.rule2, text: 'ink2' },
});

export interface VerdictBlockProps {
  verdict: Verdict;
  /** What the number is of; left out where a word stands in its place. */
  quantity?: string;
  /** The number with its unit, or "unstable", or why nothing is judged. */
  value: string;
  /** A word or a sentence in the place of the number is set smaller. */
  words?: boolean;
}

/** The number first: shape, word, quantity and number on one block, more ink the nearer the edge. */
export function VerdictBlock({ verdict, quantity, value, words = false }: VerdictBlockProps) {
  const { colors } = useTheme();
  const look = looks(colors)[verdict];
  const dashed = verdict === 'notJudged' && styles.dashed;
  return (
    <View style={[styles.block, { backgroundColor: look.fill, borderColor: look.edge }, dashed]}>
      <View style={styles.word}>
        <VerdictGlyph verdict={verdict} size={24} color={colors[look.text]} />
        <Text step="h3" weight={700} tone={look.text}>
          {verdictWords[verdict]}
        </Text>
      </View>
      {quantity ? (
        <Text step="h3" tone={look.text}>
          {quantity}
        </Text>
      ) : null}
      <Text step={words ? 'big' : 'hero'} tone={look.text} style={words && styles.reason}>
        {value}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  block: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 10,
    minHeight: 62,
    paddingVertical: 6,
    paddingLeft: 10,
    paddingRight: 12,
    borderWidth: 2,
    borderRadius: corner,
    alignSelf: 'flex-start',
    flexShrink: 1,
  },
  dashed: { borderStyle: 'dashed' },
  word: { alignItems: 'center', gap: 3 },
  reason: { fontSize: 24, lineHeight: 26, flexShrink: 1 },
});
