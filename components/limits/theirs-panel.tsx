import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { ago } from '@/components/ui/moment';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter, line } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import type { ReadLimits } from '@/hooks/queries/limits';
import { rowOf } from './model/demand-row';
import type { Difference } from './model/meet-theirs';
import { longName, rowWords } from './model/row-words';

export interface TheirsPanelProps {
  kept: ReadLimits;
  differing: readonly Difference[];
  onTakeRow: (difference: Difference) => void;
  onTakeAll: () => void;
  onPutMine: () => void;
}

const changers = { you: 'changed by you', them: 'changed by them', both: 'changed by both' } as const;

/** Someone kept other limits than those this edit began from: theirs beside yours, demand by demand, and what can be done. */
export function TheirsPanel({ kept, differing, onTakeRow, onTakeAll, onPutMine }: TheirsPanelProps) {
  const { colors } = useTheme();
  const when = kept.updatedAt ? ` ${ago(kept.updatedAt, new Date())}` : '';
  const who = kept.updatedBy ?? 'Someone';
  return (
    <View role="region" aria-label="Theirs beside yours" style={[styles.panel, { backgroundColor: colors.paper, borderColor: colors.ink }]}>
      <View role="alert" style={styles.head}>
        <Heading level={2}>{`${who} changed the limits ${when.trim()}`}</Heading>
        <Text step="note" tone="ink2">
          What you typed is still here and not kept. On top of theirs, what you changed stands as you have it, the rest as they have it.
        </Text>
      </View>
      <View role="list" aria-label="Where the two part">
        {differing.map((difference) => (
          <DifferenceRow key={difference.key} difference={difference} who={who} onTake={() => onTakeRow(difference)} />
        ))}
      </View>
      <View style={styles.actions}>
        <Button label="Take theirs" onPress={onTakeAll} />
        <Button kind="primary" label="Put mine on top" onPress={onPutMine} />
      </View>
    </View>
  );
}

function DifferenceRow({ difference, who, onTake }: { difference: Difference; who: string; onTake: () => void }) {
  const { colors } = useTheme();
  const units = useUnits();
  const phone = useLayout() === 'phone';
  const { yours, theirs, changedBy } = difference;
  const quantity = (yours ?? theirs)!.quantity;
  const name = longName(quantity);
  const side = [phone ? null : styles.side];
  return (
    <View role="listitem" style={[phone ? styles.stacked : styles.row, { borderTopColor: colors.rule }]}>
      <View style={side}>
        <Text step="h3">{name}</Text>
        <Text step="small" tone="ink2">
          {changers[changedBy]}
        </Text>
      </View>
      <View style={side}>
        <Text step="small" tone="ink2">
          yours
        </Text>
        <Text>{yours ? rowWords(yours, units) : 'not demanded'}</Text>
      </View>
      <View style={side}>
        <Text step="small" tone="ink2">
          {`theirs, ${who}`}
        </Text>
        <Text>{theirs ? rowWords(rowOf(theirs, units), units) : 'not demanded'}</Text>
      </View>
      <Button kind="quiet" label="Take theirs here" aria-label={`Take theirs, ${name}`} onPress={onTake} />
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { borderWidth: line.field, padding: gutter.phone, gap: 8 },
  head: { gap: 2 },
  row: { flexDirection: 'row', alignItems: 'center', gap: 16, paddingVertical: 6, borderTopWidth: 1 },
  stacked: { gap: 4, paddingVertical: 8, borderTopWidth: 1 },
  side: { flex: 1, minWidth: 0 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: 8, justifyContent: 'flex-end' },
});
