import { Menu } from '@/components/ui/menu';
import { Quantity, quantityRules } from '@/contract';
import { quantityName } from '@/figures/quantity-text';
import { type DemandRow, emptyRow, keyOf } from './model/demand-row';
import { boundWords } from './model/row-words';

export interface AddQuantityProps {
  label: string;
  /** It stands at the foot of the page. */
  rises: boolean;
  rows: readonly DemandRow[];
  onAdd: (row: DemandRow) => void;
}

/** Every demand that can be made and is not made yet. */
export const addable = (rows: readonly DemandRow[]): DemandRow[] => {
  const made = new Set(rows.map(keyOf));
  return Quantity.options
    .flatMap((quantity) => quantityRules[quantity].bounds.map((bound) => emptyRow({ quantity, bound })))
    .filter((row) => !made.has(keyOf(row)));
};

/** What else can be demanded, by name and by the sense of it. */
export function AddQuantity({ label, rises, rows, onAdd }: AddQuantityProps) {
  const items = addable(rows).map((row) => ({
    key: keyOf(row),
    label: quantityName(row.quantity),
    hint: boundWords[row.bound],
    onSelect: () => onAdd(row),
  }));
  return items.length === 0 ? null : <Menu label={label} rises={rises} items={items} />;
}
