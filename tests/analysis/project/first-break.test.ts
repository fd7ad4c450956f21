import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { firstBreak } from '@/analysis/project';

/** A case is the share of the way at which it gives way. */
const givesWay = (at: number, share: number) => (share >= at ? `at ${at}` : null);

describe('the first break', () => {
  it('is that of the case which gives way first, in whatever order they stand', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 1e-5, max: 2, noNaN: true }), { minLength: 1, maxLength: 60 }), (cases) => {
        const earliest = Math.min(...cases);
        const found = firstBreak(cases, givesWay);
        expect(found === null).toBe(earliest > 1);
        if (found === null) return;
        expect(found.holds).toBeLessThan(earliest);
        expect(found.breaks).toBeGreaterThanOrEqual(earliest);
        expect(found.breaks - found.holds).toBeLessThanOrEqual(Math.max(5e-4 * found.breaks, 1e-6));
        expect(givesWay(found.case, found.breaks)).toBe(found.what);
      }),
    );
  });

  it('asks each case a few times at most, even where each gives way before the one before it', () => {
    const worstLast = Array.from({ length: 400 }, (_, k) => 0.9 - k / 500);
    let asked = 0;
    firstBreak(worstLast, (at, share) => {
      if (share > 0) asked += 1;
      return givesWay(at, share);
    });
    expect(asked).toBeLessThan(4 * worstLast.length);
  });

  it('is at the start where something is broken already', () => {
    expect(firstBreak([0.5, 0], givesWay)).toMatchObject({ holds: 0, breaks: 0, case: 0 });
  });

  it('stays what was known where nothing comes before it', () => {
    const known = { holds: 0.2, breaks: 0.21, case: 9, what: 'known' };
    expect(firstBreak([0.5, 0.3], givesWay, known)).toBe(known);
    expect(firstBreak([0.5, 0.1], givesWay, known)).toMatchObject({ case: 0.1 });
  });
});
