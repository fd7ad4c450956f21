import type { Quantity, Verdict } from '@/contract';
import { caseAxes } from '@/figures/axis-text';
import type { CaseNumber } from '../model/case-number';
import type { CaseView } from '../model/case-view';
import { byWorst } from '../model/worst-number';

/** One case with every number that is demanded of it. */
export interface ListRow {
  readonly view: CaseView;
  readonly verdict: Verdict;
  readonly numbers: readonly CaseNumber[];
}

export interface ListSort {
  /** A column; "order" is the order in which the cases were made. */
  readonly by: 'order' | 'name' | 'verdict' | Quantity;
  readonly reversed: boolean;
}

const fromWorst: readonly Verdict[] = ['fail', 'notJudged', 'tight', 'pass'];

const byPlace = ({ view: a }: ListRow, { view: b }: ListRow): number => {
  const differences = caseAxes.map((axis) => (a.kept.axes[axis] ?? Infinity) - (b.kept.axes[axis] ?? Infinity));
  return (
    differences.find((difference) => difference !== 0 && !Number.isNaN(difference)) ??
    a.kept.name.localeCompare(b.kept.name, 'en', { numeric: true })
  );
};

function comparing({ by }: ListSort, columns: readonly Quantity[]): (a: ListRow, b: ListRow) => number {
  if (by === 'order') return () => 0;
  if (by === 'name') return byPlace;
  if (by === 'verdict') return (a, b) => fromWorst.indexOf(a.verdict) - fromWorst.indexOf(b.verdict);
  const at = columns.indexOf(by);
  return (a, b) => byWorst(a.numbers[at], b.numbers[at]);
}

/** Rows in the order asked for: numbers and verdicts from the edge inwards, names by their place on the axes. */
export function sortedRows(rows: readonly ListRow[], sort: ListSort, columns: readonly Quantity[]): ListRow[] {
  const compare = comparing(sort, columns);
  const sorted = [...rows].sort(compare);
  return sort.reversed ? sorted.reverse() : sorted;
}
