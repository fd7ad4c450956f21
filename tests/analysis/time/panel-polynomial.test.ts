import { describe, expect, it } from 'vitest';
import { NODE_COUNT, NODES } from '@/analysis/time/nodes';
import { bendBound, evaluatePanel, fitPanel, isSurelyMonotone, slopeOfPanel } from '@/analysis/time/panel-polynomial';

/** The coefficients of f, given on [−1, 1], beside another panel. */
function fitted(f: (x: number) => number): Float64Array {
  const values = new Float64Array(2 * NODE_COUNT);
  NODES.forEach((node, i) => (values[NODE_COUNT + i] = f(2 * node - 1)));
  const coefficients = new Float64Array(2 * NODE_COUNT);
  fitPanel(values, NODE_COUNT, coefficients);
  return coefficients;
}

const places = Array.from({ length: 41 }, (_, k) => k / 20 - 1);

describe('the polynomial of a panel', () => {
  it('gives back every polynomial of its degree, with its slope', () => {
    const c = fitted((x) => 3 - x + 2 * x ** 5 - x ** 8);
    for (const x of places) {
      expect(evaluatePanel(c, NODE_COUNT, x)).toBeCloseTo(3 - x + 2 * x ** 5 - x ** 8, 12);
      expect(slopeOfPanel(c, NODE_COUNT, x)).toBeCloseTo(-1 + 10 * x ** 4 - 8 * x ** 7, 12);
    }
  });

  it('follows a swing of 1.25 rad to 3e-10', () => {
    const c = fitted((x) => Math.sin(0.625 * x + 1));
    for (const x of places) expect(Math.abs(evaluatePanel(c, NODE_COUNT, x) - Math.sin(0.625 * x + 1))).toBeLessThan(3e-10);
  });

  it('is called monotone where it only falls, never where it turns', () => {
    expect(isSurelyMonotone(fitted((x) => Math.exp(-0.6 * x)), NODE_COUNT)).toBe(true); // prettier-ignore
    expect(isSurelyMonotone(fitted((x) => (x - 0.9) ** 2), NODE_COUNT)).toBe(false); // prettier-ignore
  });

  it('bends no more than its bound', () => {
    const c = fitted((x) => Math.cos(2 * x));
    for (const x of places) expect(4 * Math.abs(Math.cos(2 * x))).toBeLessThanOrEqual(bendBound(c, NODE_COUNT) + 1e-2);
  });
});
