import { View } from 'react-native';
import { Menu } from '@/components/ui/menu';
import type { Quantity } from '@/contract';
import { quantityName } from '@/figures/quantity-text';
import type { ListSort } from './list-sort';

interface SortMenuProps {
  columns: readonly Quantity[];
  sort: ListSort;
  onSort: (sort: ListSort) => void;
}

/** The order of the list where there are no columns to press. */
export function SortMenu({ columns, sort, onSort }: SortMenuProps) {
  const orders: readonly (readonly [ListSort['by'], string])[] = [
    ['order', 'as they were made'],
    ['name', 'by place'],
    ['verdict', 'by verdict'],
    ...columns.map((quantity) => [quantity, `by ${quantityName(quantity)}, worst first`] as const),
  ];
  const current = orders.find(([by]) => by === sort.by)?.[1] ?? '';
  return (
    <View style={{ alignSelf: 'flex-start', zIndex: 11 }}>
      <Menu
        label={current}
        name="Order"
        kind="quiet"
        items={orders.map(([by, label]) => ({
          key: by,
          label,
          current: by === sort.by,
          onSelect: () => onSort({ by, reversed: false }),
        }))}
      />
    </View>
  );
}
