import { Menu } from '@/components/ui/menu';
import { quantityName } from '@/figures/quantity-text';
import { useLimitsTable } from './limits-context';
import type { DemandRow } from './model/demand-row';

/** What else can be done with one demand: write it as its inverse where it has one, and take it out. */
export function RowMenu({ row }: { row: DemandRow }) {
  const { otherwiseOf, rewrite, takeOut } = useLimitsTable();
  const name = quantityName(row.quantity);
  const into = otherwiseOf(row);
  const otherwise = into
    ? [
        {
          key: 'rewrite',
          label: `Write as ${quantityName(into)}`,
          hint: 'the same demand; no verdict changes',
          onSelect: () => rewrite(row),
        },
      ]
    : [];
  const out = { key: 'out', label: 'Take out', hint: 'it is then no longer demanded', onSelect: () => takeOut(row) };
  return <Menu label="More" name={`More about ${name}`} icon="more" align="right" items={[...otherwise, out]} />;
}
