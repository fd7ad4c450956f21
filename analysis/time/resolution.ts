import type { Curve } from './curve';
import { NODE_COUNT } from './nodes';

/** The last two Chebyshev coefficients of a resolved panel stay below this share of the curve's size. */
const TAIL = 1e-6;

const DEGREE = NODE_COUNT - 1;

/** Weights that take node values to the Chebyshev coefficients of the two highest degrees. */
const TAIL_WEIGHTS = [DEGREE - 1, DEGREE].map((k) =>
  Float64Array.from({ length: NODE_COUNT }, (_, j) => {
    const ends = j === 0 || j === DEGREE ? 0.5 : 1;
    return ((k === DEGREE ? 1 : 2) / DEGREE) * ends * Math.cos((Math.PI * k * j) / DEGREE);
  }),
);

/** Whether the panels from `first` on follow the curve they stand for, told by how their coefficients fall off. */
export function isResolved(curve: Curve, first = 0): boolean {
  for (let offset = first * NODE_COUNT; offset < curve.nodes; offset += NODE_COUNT) {
    for (const weights of TAIL_WEIGHTS) {
      let coefficient = 0;
      for (let j = 0; j < NODE_COUNT; j += 1) coefficient += weights[j] * curve.values[offset + j];
      if (Math.abs(coefficient) > TAIL * curve.size) return false;
    }
  }
  return true;
}
