import { StyleSheet, View } from 'react-native';
import { useMayEdit } from '@/components/navigation/project-context';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import type { Conditions, KeptAnalysis } from '@/contract';
import { AnalyseAgain } from './analyse-again';
import { type Change, changedSince } from './model/changed-since';
import { together } from './panel/end-words';

const words: Readonly<Record<Change, string>> = {
  cases: 'cases',
  plants: 'the plant',
  limits: 'limits',
  operatingRange: 'what was declared of the edges',
};

/** "Cases and limits changed since rev 7 was analysed." */
export function changeText(changes: readonly Change[], revision: number): string {
  const said = together(changes.map((change) => words[change]));
  return `${said.charAt(0).toUpperCase()}${said.slice(1)} changed since rev ${revision} was analysed.`;
}

/** Says that the numbers on the page were kept under other conditions than those of now, and has them computed anew. */
export function ChangedBanner({ analysis, conditions, caseCount }: { analysis: KeptAnalysis; conditions: Conditions; caseCount: number }) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const mayEdit = useMayEdit();
  const changes = changedSince(analysis.inputs, conditions);
  if (changes.length === 0) return null;
  return (
    <View role="status" style={[styles.bar, phone ? styles.stack : styles.line, { backgroundColor: colors.bar }]}>
      <Text step="note" tone="ink2" style={styles.text}>
        <Text step="note" weight={600}>
          {`${changeText(changes, analysis.design.revision)} `}
        </Text>
        {changes.includes('limits') ? 'Verdicts here use the old ones.' : 'The numbers here are those of before.'}
      </Text>
      {mayEdit ? (
        <AnalyseAgain design={analysis.design} caseCount={caseCount} label={`Analyse rev ${analysis.design.revision} again`} />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: { paddingVertical: 8, gap: 10 },
  line: { flexDirection: 'row', alignItems: 'center', paddingHorizontal: gutter.wide },
  stack: { alignItems: 'flex-start', paddingHorizontal: gutter.phone },
  text: { flexShrink: 1, flexGrow: 1 },
});
