import { Pressable, type StyleProp, StyleSheet, View, type ViewStyle } from 'react-native';
import { Text } from '@/components/ui/text';
import { quantityName } from '@/figures/quantity-text';
import type { ListSort } from './list-sort';

interface SortHeadProps {
  by: Exclude<ListSort['by'], 'order'>;
  /** The quantity's where absent. */
  name?: string;
  sort: ListSort;
  onSort: (sort: ListSort) => void;
  style: StyleProp<ViewStyle>;
}

/** A column's name: pressed it sorts by that column, pressed again the other way round. */
export function SortHead({ by, name, sort, onSort, style }: SortHeadProps) {
  const here = sort.by === by;
  const text = name ?? quantityName(by as Parameters<typeof quantityName>[0]);
  const order = here ? (sort.reversed ? 'descending' : 'ascending') : 'none';
  return (
    <View role="columnheader" aria-sort={order} style={style}>
      <Pressable
        role="button"
        aria-label={`Sort by ${text}`}
        onPress={() => onSort({ by, reversed: here && !sort.reversed })}
        style={[styles.button, name === undefined && styles.right]}
      >
        <Text step="small" weight={here ? 700 : 500} tone={here ? 'ink' : 'ink2'} numberOfLines={2} style={styles.text}>
          {text}
          {here ? (sort.reversed ? ' ▴' : ' ▾') : ''}
        </Text>
      </Pressable>
    </View>
  );
}

const styles = StyleSheet.create({
  button: { minHeight: 44, flexDirection: 'row', alignItems: 'center', paddingHorizontal: 8 },
  right: { justifyContent: 'flex-end', paddingHorizontal: 0 },
  text: { flexShrink: 1 },
});
