import type { Axis, CaseAxes } from '@/contract';
import { caseAxes } from '@/figures/axis-text';
import type { CaseView } from './case-view';

/** One load, or one condition beside that along which the columns run. */
export interface GridRow {
  readonly key: string;
  readonly place: CaseAxes;
}

/** Cases laid out by their axes: columns along one, a row for each combination of the others. */
export interface CaseGridLayout {
  readonly column: Axis;
  readonly rowAxes: readonly Axis[];
  readonly columns: readonly number[];
  readonly rows: readonly GridRow[];
  /** By row and column; a place may hold several cases or none. */
  readonly cells: readonly (readonly (readonly CaseView[])[])[];
  /** Cases that have no place along the columns. */
  readonly off: readonly CaseView[];
}

const ascending = (values: Iterable<number>) => [...new Set(values)].sort((a, b) => a - b);

const placeIn = (rowAxes: readonly Axis[], axes: CaseAxes): CaseAxes =>
  Object.fromEntries(rowAxes.flatMap((axis) => (axes[axis] === undefined ? [] : [[axis, axes[axis]]])));

const inOrder = (rowAxes: readonly Axis[]) => (a: GridRow, b: GridRow) =>
  rowAxes
    .map((axis) => (a.place[axis] ?? Infinity) - (b.place[axis] ?? Infinity))
    .find((difference) => difference !== 0 && !Number.isNaN(difference)) ?? 0;

/** The grid that cases make by their axes; null where none has a place on any. */
export function caseGrid(views: readonly CaseView[]): CaseGridLayout | null {
  const used = caseAxes.filter((axis) => views.some(({ kept }) => kept.axes[axis] !== undefined));
  const [column, ...rowAxes] = used;
  if (column === undefined) return null;
  const placed = views.filter(({ kept }) => kept.axes[column] !== undefined);
  const columns = ascending(placed.flatMap(({ kept }) => kept.axes[column] ?? []));
  const keyOf = ({ kept }: CaseView) => JSON.stringify(rowAxes.map((axis) => kept.axes[axis] ?? null));
  const rows = [...new Map(placed.map((view) => [keyOf(view), { key: keyOf(view), place: placeIn(rowAxes, view.kept.axes) }])).values()];
  rows.sort(inOrder(rowAxes));
  const cells = rows.map(({ key }) => columns.map((at) => placed.filter((view) => keyOf(view) === key && view.kept.axes[column] === at)));
  return { column, rowAxes, columns, rows, cells, off: views.filter((view) => !placed.includes(view)) };
}
