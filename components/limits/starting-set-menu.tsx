import { useState } from 'react';
import { View } from 'react-native';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Menu, type MenuProps } from '@/components/ui/menu';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { type DemandRow, keyOf, rowsOf } from './model/demand-row';
import { longName, rowWords } from './model/row-words';
import { type StartingSet, startingSets } from './model/starting-sets';

export interface StartingSetMenuProps extends Pick<MenuProps, 'label' | 'kind'> {
  rows: readonly DemandRow[];
  onTake: (rows: DemandRow[], set: StartingSet) => void;
}

/** Limits to begin from, by name. Where something is demanded already, what goes and what comes is shown first. */
export function StartingSetMenu({ rows, onTake, ...menu }: StartingSetMenuProps) {
  const units = useUnits();
  const [asked, ask] = useState<StartingSet | null>(null);
  const take = (set: StartingSet) => {
    ask(null);
    onTake(rowsOf(set.limits, units), set);
  };
  const items = startingSets.map((set) => ({
    key: set.name,
    label: set.name,
    hint: set.about,
    onSelect: () => (rows.length === 0 ? take(set) : ask(set)),
  }));
  return (
    <>
      <Menu {...menu} align="right" items={items} />
      <Dialog open={asked !== null} title={`Start from the set “${asked?.name}”?`} onClose={() => ask(null)}>
        {asked ? <Exchange now={rows} then={rowsOf(asked.limits, units)} /> : null}
        <Text tone="ink2">It can be undone, and nothing is kept yet.</Text>
        <DialogDecision label="Replace" onDecide={() => asked && take(asked)} onClose={() => ask(null)} />
      </Dialog>
    </>
  );
}

function Exchange({ now, then }: { now: readonly DemandRow[]; then: readonly DemandRow[] }) {
  const units = useUnits();
  const keys = [...new Set([...now, ...then].map(keyOf))];
  const words = (rows: readonly DemandRow[], key: string) => {
    const row = rows.find((other) => keyOf(other) === key);
    return row ? rowWords(row, units) : 'not demanded';
  };
  return (
    <View role="list" aria-label="What it replaces" style={{ gap: 8 }}>
      {keys.map((key) => {
        const { quantity } = [...now, ...then].find((row) => keyOf(row) === key)!;
        return (
          <View key={key} role="listitem">
            <Text weight={600}>{longName(quantity)}</Text>
            <Text step="note" tone="ink2">{`now ${words(now, key)}`}</Text>
            <Text step="note">{`then ${words(then, key)}`}</Text>
          </View>
        );
      })}
    </View>
  );
}
