import { describe, expect, it } from 'vitest';
import { endSpot, nextSpot } from '@/components/cases/grid/use-grid-keys';

const cells = [
  [true, false, true],
  [true, true, false],
];
const at = (row: number, column: number) => ({ row, column });

describe('arrows in the grid of cases', () => {
  it('go to the next place that holds a case, over those that hold none', () => {
    expect(nextSpot(cells, at(0, 0), [0, 1])).toEqual(at(0, 2));
    expect(nextSpot(cells, at(1, 1), [0, -1])).toEqual(at(1, 0));
  });

  it('stay where there is none further', () => {
    expect(nextSpot(cells, at(0, 2), [1, 0])).toEqual(at(0, 2));
    expect(nextSpot(cells, at(0, 0), [-1, 0])).toEqual(at(0, 0));
  });

  it('go to the ends of a row, and with Ctrl of the grid', () => {
    expect(endSpot(cells, at(1, 0), { last: true, whole: false })).toEqual(at(1, 1));
    expect(endSpot(cells, at(1, 1), { last: false, whole: true })).toEqual(at(0, 0));
    expect(endSpot(cells, at(0, 0), { last: true, whole: true })).toEqual(at(1, 1));
  });
});
