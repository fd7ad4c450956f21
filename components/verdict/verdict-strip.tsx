import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import type { CaseResult, Headline, Room } from '@/contract';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import { VerdictBlock } from '@/components/ui/verdict-block';
import { BesideLine } from './beside-line';
import { CheckRulers } from './check-rulers';
import { headlineLines, headlineText } from './headline-text';
import { HeadlineRuler } from './headline-ruler';
import { marginNumbers } from './margin-numbers';
import { MarginRow } from './margin-row';
import { RoomBlock, RoomSentence } from './room-block';
import { mostPressing, worstChecks } from './worst-checks';

export interface VerdictStripProps {
  headline: Headline;
  /** Null where it was not computed, or nothing is demanded; "sought" keeps its place while it is looked for. */
  room: Room | 'sought' | null;
  results: readonly CaseResult[];
  /** Stands in the place of the rulers on a wide screen, where the page itself shows every case. */
  instead?: ReactNode;
  label?: string;
}

/** As many as stand side by side on a wide screen. */
const MOST_RULERS = 5;

/** The number first: the worst over all cases, its case and frequency, the room that is left, and everything that is demanded on its ruler. */
export function VerdictStrip({ headline, room, results, instead, label = 'Worst margin over all cases' }: VerdictStripProps) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const text = headlineText(headline, useUnits());
  return (
    <View
      role="region"
      aria-label={label}
      style={[styles.strip, phone ? styles.phone : styles.wide, { backgroundColor: colors.paper, borderBottomColor: colors.rule2 }]}
    >
      <View style={styles.head}>
        <View style={text.words ? styles.shrinking : styles.whole}>
          <VerdictBlock verdict={headline.verdict} quantity={text.quantity ?? undefined} value={text.value} words={text.words} />
        </View>
        <View style={styles.text}>
          {headline.case && (
            <Text step="note" weight={600}>
              {headline.case.name}
            </Text>
          )}
          {headlineLines(headline, text, results.length).map((line) => (
            <Text key={line} step="note" tone="ink2">
              {line}
            </Text>
          ))}
          {headline.beside && <BesideLine beside={headline.beside} />}
        </View>
      </View>
      {room && !phone ? <RoomBlock room={room} besideCase={headline.case?.name} /> : null}
      {(!phone && instead) || <Demands headline={headline} results={results} />}
      {room && phone ? <RoomSentence room={room} besideCase={headline.case?.name} /> : null}
    </View>
  );
}

/** Rulers where limits are demanded; the margins of the headline's case where none are, and struck out where it is not stable. */
function Demands({ headline, results }: Pick<VerdictStripProps, 'headline' | 'results'>) {
  const units = useUnits();
  const phone = useLayout() === 'phone';
  const checks = mostPressing(worstChecks(results), MOST_RULERS);
  if (checks.length === 0 || headline.unstableCases > 0) {
    const { numbers } = results.find((result) => result.case.id === headline.case?.id) ?? results[0];
    return <MarginRow numbers={marginNumbers(numbers, units)} unstable={!numbers.closedLoop.stable} compact={phone} />;
  }
  if (!phone) return <CheckRulers checks={checks} />;
  const worst = checks.find(({ check }) => check.quantity === headline.quantity) ?? checks[0];
  return <HeadlineRuler worst={worst} />;
}

const styles = StyleSheet.create({
  strip: { borderBottomWidth: 1 },
  phone: { paddingHorizontal: gutter.phone, paddingBottom: 10, gap: 8 },
  wide: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    columnGap: 22,
    rowGap: 8,
    minHeight: 84,
    paddingHorizontal: gutter.wide,
    paddingVertical: 8,
  },
  head: { flexDirection: 'row', alignItems: 'center', gap: 12, flexShrink: 1 },
  whole: { flexShrink: 0 },
  shrinking: { flexShrink: 1 },
  text: { flexShrink: 1, gap: 1 },
});
