import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Complex } from '@/analysis';
import { expandRoots } from '@/analysis/numbers/polynomial';
import { polynomialRoots } from '@/analysis/numbers/polynomial-roots';

const real = (...values: number[]): Complex[] => values.map((re) => ({ re, im: 0 }));
const nearest = (roots: readonly Complex[], { re, im }: Complex) =>
  Math.min(...roots.map((z) => Math.hypot(z.re - re, z.im - im))) / Math.hypot(re, im);

describe('roots of a polynomial', () => {
  it('finds what a formula gives exactly', () => {
    expect(polynomialRoots([0.35, 1, 0])).toEqual(real(0, -1 / 0.35));
    expect(polynomialRoots([0, 0, 2, 0, 0])).toEqual(real(0, 0));
    expect(polynomialRoots([1, 0, 4])).toEqual([
      { re: 0, im: 2 },
      { re: 0, im: -2 },
    ]);
    expect(polynomialRoots([5])).toEqual([]);
  });

  it('loses nothing of the small root where the other is 1e16 times as large', () => {
    expect(polynomialRoots([1, 1e8, 1])[0].re).toBeCloseTo(-1e-8, 22);
  });

  it.each([
    ['threefold', [1, 3, 3, 1], real(-1, -1, -1)],
    ['fivefold', [1, 5, 10, 10, 5, 1], real(-1, -1, -1, -1, -1)],
    ['two undamped pairs in one place', [1, 0, 2, 0, 1], [1, -1, 1, -1].map((im) => ({ re: 0, im }))],
  ])('has a %s root to the last digit', (_, coefficients, want) => expect(polynomialRoots(coefficients)).toEqual(want));

  it('has time constants from 0.1 ms to hours to rounding', () => {
    const want = real(-1e-4, -1, -1e4, -0.02);
    const got = polynomialRoots(expandRoots(want));
    want.forEach((root) => expect(nearest(got, root)).toBeLessThan(1e-14));
  });

  it('finds the 24 roots of s²⁴ + 1 on the unit circle', () => {
    const got = polynomialRoots([1, ...new Array<number>(23).fill(0), 1]);
    expect(got).toHaveLength(24);
    got.forEach(({ re, im }) => expect(Math.hypot(re, im)).toBeCloseTo(1, 14));
  });

  it('gives conjugates in exact pairs that reproduce the polynomial', () => {
    const coefficient = fc.double({ min: -100, max: 100, noNaN: true }).filter((c) => Math.abs(c) > 1e-3);
    fc.assert(
      fc.property(fc.array(coefficient, { minLength: 4, maxLength: 9 }), (coefficients) => {
        const roots = polynomialRoots(coefficients);
        expect(roots).toHaveLength(coefficients.length - 1);
        roots.forEach((root, i) => {
          if (root.im > 0) expect(roots[i + 1]).toEqual({ re: root.re, im: -root.im });
        });
        const magnitudes = expandRoots(roots.map(({ re, im }) => ({ re: -Math.hypot(re, im), im: 0 })));
        expandRoots(roots).forEach((c, k) =>
          expect(Math.abs(c * coefficients[0] - coefficients[k])).toBeLessThanOrEqual(1e-11 * Math.abs(coefficients[0]) * magnitudes[k]),
        );
      }),
      { seed: 20, numRuns: 200 },
    );
  });
});
