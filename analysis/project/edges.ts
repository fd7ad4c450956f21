import type { Axis, Edge, FrozenCase, OperatingRange } from '@/contract';

/** What was checked, and what of its ends was declared. */
export interface Checked {
  readonly cases: readonly Pick<FrozenCase, 'id' | 'axes'>[];
  readonly operatingRange: readonly OperatingRange[];
}

const axes: readonly Axis[] = ['speed', 'mass', 'grade'];

function endsAt(value: number, along: readonly number[]): Edge['end'][] {
  const [low, high] = [Math.min(...along), Math.max(...along)];
  // One value is not a grid: nothing was varied there, so nothing points beyond it.
  if (low === high) return [];
  return [...(value === low ? ['low' as const] : []), ...(value === high ? ['high' as const] : [])];
}

/** The ends of the grid at which a case stands, axis by axis; none on an axis along which only one value was checked. */
export function edgesOf(caseId: string, { cases, operatingRange }: Checked): Edge[] {
  const place = cases.find(({ id }) => id === caseId)?.axes ?? {};
  return axes.flatMap((axis) => {
    const value = place[axis];
    if (value === undefined) return [];
    const along = cases.flatMap((other) => other.axes[axis] ?? []);
    const declared = operatingRange.find((range) => range.axis === axis);
    const physical = { low: declared?.lowIsPhysical ?? false, high: declared?.highIsPhysical ?? false };
    return endsAt(value, along).map((end) => ({ axis, end, physical: physical[end] }));
  });
}

/** How many ends at which the case stands may still be passed on the road. */
export const openEdges = (caseId: string, checked: Checked) => edgesOf(caseId, checked).filter(({ physical }) => !physical).length;
