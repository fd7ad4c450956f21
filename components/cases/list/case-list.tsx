import { memo, useMemo, useState } from 'react';
import { View } from 'react-native';
import { Button } from '@/components/ui/button';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import type { Quantity } from '@/contract';
import { caseNumber } from '../model/case-number';
import { caseVerdict } from '../model/case-verdict';
import type { CaseView } from '../model/case-view';
import { CaseRow } from './case-row';
import { CaseTable } from './case-table';
import { type ListRow, type ListSort, sortedRows } from './list-sort';
import { SortMenu } from './sort-menu';

export interface CaseListProps {
  views: readonly CaseView[];
  /** The columns: what is demanded, else the number that is shown. */
  columns: readonly Quantity[];
  worst: string | undefined;
  selected: string | undefined;
  onOpen: (caseId: string) => void;
}

/** As many rows as are drawn before one asks for the rest. */
const FIRST_ROWS = 60;

/** Every case with every check, to be sorted by any of them. */
export const CaseList = memo(function CaseList({ views, columns, worst, selected, onOpen }: CaseListProps) {
  const units = useUnits();
  const phone = useLayout() === 'phone';
  const [sort, setSort] = useState<ListSort>({ by: 'order', reversed: false });
  const [all, showAll] = useState(false);
  const rows = useMemo(
    () =>
      views.map((view): ListRow => ({
        view,
        verdict: caseVerdict(view),
        numbers: columns.map((quantity) => caseNumber(view, quantity, units)),
      })),
    [views, columns, units],
  );
  const sorted = useMemo(() => sortedRows(rows, sort, columns), [rows, sort, columns]);
  const shown = all ? sorted : sorted.slice(0, FIRST_ROWS);
  const place = { worst, selected, onOpen };
  return (
    <View>
      {phone ? (
        <>
          <SortMenu columns={columns} sort={sort} onSort={setSort} />
          <View role="list" aria-label="Cases">
            {shown.map((row) => (
              <CaseRow key={row.view.kept.id} row={row} columns={columns} {...place} />
            ))}
          </View>
        </>
      ) : (
        <CaseTable rows={shown} columns={columns} sort={sort} onSort={setSort} {...place} />
      )}
      {shown.length < sorted.length ? <Button kind="quiet" label={`All ${sorted.length} cases`} onPress={() => showAll(true)} /> : null}
    </View>
  );
});
