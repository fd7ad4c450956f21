import { describe, expect, it } from 'vitest';
import * as fc from 'fast-check';
import { columnNorm, identityMatrix, matrixOf, multiply, weightedSum, type Matrix } from '@/analysis/numbers/matrix';
import { balancingScales } from '@/analysis/numbers/matrix-balance';
import { exponential } from '@/analysis/numbers/matrix-exponential';
import { solve } from '@/analysis/numbers/matrix-solve';

const EPSILON = 2 ** -52;
const difference = (a: Matrix, b: Matrix) =>
  columnNorm(
    weightedSum([
      [1, a],
      [-1, b],
    ]),
  );
const square = (order: number, size: number) =>
  fc
    .array(fc.double({ min: -size, max: size, noNaN: true }), { minLength: order * order, maxLength: order * order })
    .map((data): Matrix => ({ rows: order, columns: order, data: Float64Array.from(data) }));

describe('solve', () => {
  it('solves a system that needs its rows exchanged', () => {
    const x = solve(matrixOf([[0, 2], [4, 1]]), matrixOf([[6], [11]])); // prettier-ignore
    expect([...x.data]).toEqual([2, 3]);
  });

  it('refuses a singular matrix', () => {
    expect(() => solve(matrixOf([[1, 2], [2, 4]]), identityMatrix(2))).toThrow(RangeError); // prettier-ignore
  });

  it('gives back a right-hand side', () => {
    fc.assert(
      fc.property(square(5, 1), square(5, 1), (a, b) => {
        const regular = weightedSum([
          [1, a],
          [8, identityMatrix(5)],
        ]);
        expect(difference(multiply(regular, solve(regular, b)), b)).toBeLessThan(200 * EPSILON * (1 + columnNorm(b)));
      }),
      { seed: 41 },
    );
  });
});

describe('exponential', () => {
  it('of the zero matrix is the identity', () => {
    expect(difference(exponential(matrixOf([[0, 0], [0, 0]])), identityMatrix(2))).toBe(0); // prettier-ignore
  });

  it('turns by an angle, also by a thousand turns', () => {
    for (const angle of [1, 2000 * Math.PI + 1]) {
      const turned = exponential(matrixOf([[0, angle], [-angle, 0]])); // prettier-ignore
      expect(Math.abs(turned.data[0] - Math.cos(1))).toBeLessThan(40 * angle * EPSILON);
      expect(Math.abs(turned.data[1] - Math.sin(1))).toBeLessThan(40 * angle * EPSILON);
    }
  });

  it('is exact for a nilpotent matrix', () => {
    const e = exponential(matrixOf([[0, 1, 0], [0, 0, 1], [0, 0, 0]])); // prettier-ignore
    expect(difference(e, matrixOf([[1, 1, 0.5], [0, 1, 1], [0, 0, 1]]))).toBeLessThan(8 * EPSILON); // prettier-ignore
  });

  it('keeps a slow mode beside one that is sixteen decades faster', () => {
    const e = exponential(matrixOf([[-1e16, 1], [0, -1]])); // prettier-ignore
    expect(Math.abs(e.data[3] / Math.exp(-1) - 1)).toBeLessThan(100 * EPSILON);
    expect(Math.abs(e.data[1] / (Math.exp(-1) * 1e-16) - 1)).toBeLessThan(1e-12);
  });

  it('is undone by that of the opposite matrix', () => {
    fc.assert(
      fc.property(square(4, 2), (a) => {
        const e = exponential(a);
        const back = exponential(weightedSum([[-1, a]]));
        expect(difference(multiply(e, back), identityMatrix(4))).toBeLessThan(1e3 * EPSILON * columnNorm(e) * columnNorm(back));
      }),
      { seed: 42 },
    );
  });
});

describe('balancing', () => {
  it('brings rows and columns of a stiff matrix to like size by powers of two', () => {
    const scales = balancingScales(matrixOf([[-1, 2 ** 40], [2 ** -36, -1]])); // prettier-ignore
    const ratio = Math.log2(scales[1] / scales[0]);
    expect(Number.isInteger(ratio)).toBe(true);
    expect(2 ** 40 * 2 ** ratio).toBeLessThanOrEqual(8);
  });

  it('leaves a triangular chain alone where a state drives or is driven by nothing', () => {
    expect([...balancingScales(matrixOf([[-1, 1e6], [0, -2]]))]).toEqual([1, 1]); // prettier-ignore
  });
});
