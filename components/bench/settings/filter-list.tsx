import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Heading, Text } from '@/components/ui/text';
import { filterNames } from '@/figures';
import type { Filter } from '@/contract';
import { useBench, useSettings } from '../bench-context';
import { earlier, filterKinds, MOST_FILTERS, newFilter, withFilter, withoutFilter } from '../draft/filters';
import { FilterItem } from './filter-item';

/** The filters at the controller's output, in their order; each adding, removing and turning is one step of undo. */
export function FilterList() {
  const { store, analyser } = useBench();
  const { filters } = useSettings();
  const move = (next: readonly Filter[]) => store.getState().move({ filters: next });
  const add = (kind: Filter['kind']) => {
    const crossover = analyser.get().output?.analysis.margins.phase?.frequency ?? null;
    move([...filters, newFilter(kind, crossover)]);
  };
  const full = filters.length >= MOST_FILTERS;
  return (
    <View role="region" aria-label="Filters" style={styles.group}>
      <Heading level={3}>Filters</Heading>
      <Text step="note" tone="ink2">
        {filters.length === 0
          ? 'None. Filters stand at the controller’s output, on the whole command.'
          : 'On the whole command, in this order.'}
      </Text>
      {filters.map((filter, at) => (
        <FilterItem
          // The same kind in the same place of an equally long list is the same row: typing must not take the focus away.
          key={`${filters.length} ${at} ${filter.kind}`}
          filter={filter}
          place={at + 1}
          onHold={(next) => store.getState().hold({ filters: withFilter(filters, at, next) })}
          onRemove={() => move(withoutFilter(filters, at))}
          onEarlier={at > 0 ? () => move(earlier(filters, at)) : null}
        />
      ))}
      <View style={styles.add}>
        {filterKinds.map((kind) => (
          <Button key={kind} label={`Add ${filterNames[kind].toLowerCase()}`} disabled={full} onPress={() => add(kind)} />
        ))}
      </View>
      {full && (
        <Text step="note" tone="ink2">
          {`${MOST_FILTERS} is the most. Remove one to add another.`}
        </Text>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  group: { gap: 8 },
  add: { flexDirection: 'row', flexWrap: 'wrap', gap: 8 },
});
