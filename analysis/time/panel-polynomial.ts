import { matrixOf, identityMatrix } from '@/analysis/numbers/matrix';
import { solve } from '@/analysis/numbers/matrix-solve';
import { NODES, NODE_COUNT } from './nodes';

/**
 * The polynomial of one panel by its coefficients c₀ … c₈ in x from −1 at the panel's start to 1 at its end. Cheaper to
 * evaluate than node values, and as exact: over [−1, 1] powers up to the eighth lose three digits of sixteen at worst.
 */

const HALF = (NODE_COUNT - 1) / 2;

/** From −1 to 0, the first half of the nodes and the middle one. */
const PLACES = Array.from(NODES.subarray(0, HALF + 1), (node) => 2 * node - 1);

const inverse = (rows: readonly (readonly number[])[]): Float64Array => solve(matrixOf(rows), identityMatrix(rows.length)).data;

/** Nodes stand symmetrically: sums and differences of opposite values give the even and the odd coefficients by themselves. */
const EVEN = inverse(PLACES.map((x) => PLACES.map((_, k) => 2 * x ** (2 * k))));
const ODD = inverse(PLACES.slice(0, HALF).map((x) => PLACES.slice(0, HALF).map((_, k) => 2 * x ** (2 * k + 1))));

/** Coefficients of the polynomial through NODE_COUNT `values` from `offset`, to the same place in `coefficients`. */
export function fitPanel(values: Float64Array, offset: number, coefficients: Float64Array): void {
  const last = offset + NODE_COUNT - 1;
  for (let k = 0; k <= HALF; k += 1) {
    let sum = 0;
    for (let j = 0; j <= HALF; j += 1) sum += EVEN[k * (HALF + 1) + j] * (values[offset + j] + values[last - j]);
    coefficients[offset + 2 * k] = sum;
  }
  for (let k = 0; k < HALF; k += 1) {
    let sum = 0;
    for (let j = 0; j < HALF; j += 1) sum += ODD[k * HALF + j] * (values[offset + j] - values[last - j]);
    coefficients[offset + 2 * k + 1] = sum;
  }
}

/** The value at x, even and odd powers side by side. */
export function evaluatePanel(c: Float64Array, offset: number, x: number): number {
  const square = x * x;
  let even = c[offset + NODE_COUNT - 1];
  let odd = 0;
  for (let k = NODE_COUNT - 2; k > 0; k -= 2) {
    odd = odd * square + c[offset + k];
    even = even * square + c[offset + k - 1];
  }
  return even + x * odd;
}

/** The derivative to x. */
export function slopeOfPanel(c: Float64Array, offset: number, x: number): number {
  let slope = 0;
  for (let k = NODE_COUNT - 1; k > 0; k -= 1) slope = slope * x + k * c[offset + k];
  return slope;
}

/** Whether the linear term alone keeps the slope from changing its sign. */
export function isSurelyMonotone(c: Float64Array, offset: number): boolean {
  let others = 0;
  for (let k = 2; k < NODE_COUNT; k += 1) others += k * Math.abs(c[offset + k]);
  return Math.abs(c[offset + 1]) > others;
}

/** A bound on the second derivative to x. */
export function bendBound(c: Float64Array, offset: number): number {
  let bound = 0;
  for (let k = 2; k < NODE_COUNT; k += 1) bound += k * (k - 1) * Math.abs(c[offset + k]);
  return bound;
}
