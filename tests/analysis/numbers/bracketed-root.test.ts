import { describe, expect, it } from 'vitest';
import { bracketedRoot } from '@/analysis/numbers/bracketed-root';

const solve = (f: (x: number) => number, a: number, b: number) => {
  let evaluations = 0;
  const root = bracketedRoot(
    (x) => {
      evaluations += 1;
      return f(x);
    },
    { a, fa: f(a), b, fb: f(b) },
  );
  return { root, evaluations };
};

describe('a root in a bracket', () => {
  it.each([
    ['square root of 2', (x: number) => x * x - 2, 1, 2, Math.SQRT2, 9],
    ['a straight line', (x: number) => 3 * x - 1, -5, 5, 1 / 3, 3],
    ['a cosine', (x: number) => Math.cos(x) - x, 0, 1, 0.7390851332151607, 8],
    ['a ninefold root', (x: number) => x ** 9, -1, 4, 0, 125],
    ['a step of 1e12', (x: number) => Math.atan(1e12 * (x - 0.3)), 0, 1, 0.3, 60],
    ['a pole beside the root', (x: number) => 1 / (x - 1.0000001) + 1e7, 1.0000000000001, 1.00000009, 1.0, 60],
  ])('%s, within its ceiling of evaluations', (...row) => {
    const [, f, a, b, want, ceiling] = row;
    const { root, evaluations } = solve(f, a, b);
    expect(Math.abs(root - want)).toBeLessThan(1e-7);
    expect(Math.abs(f(root))).toBeLessThanOrEqual(Math.max(Math.abs(f(root * (1 + 1e-15))), Math.abs(f(root * (1 - 1e-15))), 1e-300));
    expect(evaluations).toBeLessThanOrEqual(ceiling);
  });
});
