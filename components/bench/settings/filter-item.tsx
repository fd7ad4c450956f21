import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line } from '@/components/ui/tokens';
import type { Filter } from '@/contract';
import { filterNames } from '@/figures';
import { FilterFields } from './filter-fields';
import { FilterPhase } from './filter-phase';

interface FilterItemProps {
  filter: Filter;
  /** Counted from 1. */
  place: number;
  onHold: (filter: Filter) => void;
  onRemove: () => void;
  /** null for the first. */
  onEarlier: (() => void) | null;
}

/** One filter: what it is set to, what it costs at the crossover, and its place in the row. */
export function FilterItem({ filter, place, onHold, onRemove, onEarlier }: FilterItemProps) {
  const { colors } = useTheme();
  const name = `${filterNames[filter.kind]} ${place}`;
  return (
    <View role="group" aria-label={name} style={[styles.item, { borderColor: colors.rule }]}>
      <View style={styles.head}>
        <View style={styles.name}>
          <Text weight={600}>{`${place}. ${filterNames[filter.kind]}`}</Text>
          <FilterPhase filter={filter} />
        </View>
        {onEarlier && <Button kind="quiet" label="Earlier" aria-label={`${name}, one place earlier`} onPress={onEarlier} />}
        <Button kind="quiet" label="Remove" aria-label={`Remove ${name}`} onPress={onRemove} />
      </View>
      <FilterFields filter={filter} onHold={onHold} />
    </View>
  );
}

const styles = StyleSheet.create({
  item: { borderTopWidth: line.hair, paddingTop: 8, gap: 8 },
  head: { flexDirection: 'row', alignItems: 'center', gap: 6 },
  name: { flex: 1 },
});
