import { describe, expect, it } from 'vitest';
import { earlier, filterKinds, newFilter, withFilter, withoutFilter } from '@/components/bench/draft/filters';
import { Filter } from '@/contract';

const [a, b, c] = filterKinds.map((kind) => newFilter(kind, 2));

describe('filters', () => {
  it('begin as ones that a design can hold, placed by the crossover', () => {
    for (const kind of filterKinds)
      for (const crossover of [null, 1e-4, 2, 3e5]) expect(Filter.safeParse(newFilter(kind, crossover)).success).toBe(true);
    expect(newFilter('notch', 2)).toMatchObject({ frequency: 10 });
    expect(newFilter('lowPass', 2)).toEqual({ kind: 'lowPass', timeConstant: 0.1 });
  });

  it('are set, removed and turned round where they stand', () => {
    expect(withFilter([a, b], 1, c)).toEqual([a, c]);
    expect(withoutFilter([a, b, c], 1)).toEqual([a, c]);
    expect(earlier([a, b, c], 2)).toEqual([a, c, b]);
  });
});
