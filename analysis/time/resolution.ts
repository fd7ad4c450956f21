import type { Curve } from './curve';
import { NODE_COUNT } from './nodes';

/** The last two Chebyshev coefficients of a resolved panel stay below this share of the curve's size. */
const TAIL = 1e-6;

const DEGREE = NODE_COUNT - 1;

/** Leading coefficients of the Chebyshev polynomials of the two highest degrees: no other one has these powers of x. */
const LEADING = [2 ** (DEGREE - 2), 2 ** (DEGREE - 1)];

/** Whether the panels from `first` on follow the curve they stand for, told by how their coefficients fall off. */
export function isResolved(curve: Curve, first = 0): boolean {
  const { coefficients, nodes } = curve;
  const most = TAIL * curve.size;
  for (let offset = first * NODE_COUNT; offset < nodes; offset += NODE_COUNT) {
    if (Math.abs(coefficients[offset + DEGREE - 1]) > most * LEADING[0]) return false;
    if (Math.abs(coefficients[offset + DEGREE]) > most * LEADING[1]) return false;
  }
  return true;
}
