import { matrixOf, identityMatrix } from '@/analysis/numbers/matrix';
import { solve } from '@/analysis/numbers/matrix-solve';

/** Degree of the polynomial that stands for every signal on one panel of time. */
const DEGREE = 8;
export const NODE_COUNT = DEGREE + 1;

/** Chebyshev points of the second kind on [0, 1], both ends included. */
export const NODES = Float64Array.from({ length: NODE_COUNT }, (_, i) => (1 - Math.cos((Math.PI * i) / DEGREE)) / 2);

/** Barycentric weights of these points: ±1, halved at the ends. @see REFERENCES.md [Berrut & Trefethen 2004], equation 5.4 */
const WEIGHTS = NODES.map((_, i) => (i % 2 ? -1 : 1) * (i === 0 || i === DEGREE ? 0.5 : 1));

/** The value at `position` in [0, 1] of the polynomial through NODE_COUNT `values` that begin at `offset`. */
export function interpolate(values: ArrayLike<number>, offset: number, position: number): number {
  let above = 0;
  let below = 0;
  for (let i = 0; i < NODE_COUNT; i += 1) {
    const distance = position - NODES[i];
    if (distance === 0) return values[offset + i];
    const weight = WEIGHTS[i] / distance;
    above += weight * values[offset + i];
    below += weight;
  }
  return above / below;
}

/** The weights that node values have in the polynomial's value at `position` in [0, 1]. */
export function interpolationWeights(position: number): Float64Array {
  return NODES.map((_, j) =>
    interpolate(
      NODES.map((__, i) => (i === j ? 1 : 0)),
      0,
      position,
    ),
  );
}

/** Row i gives the derivative at node i from the values at the nodes. @see REFERENCES.md [Berrut & Trefethen 2004], equation 9.4 */
const DIFFERENTIATION = Float64Array.from(
  Array.from(NODES).flatMap((node, i) => {
    const row = Array.from(NODES, (other, j) => (j === i ? 0 : WEIGHTS[j] / WEIGHTS[i] / (node - other)));
    row[i] = -row.reduce((sum, x) => sum + x, 0);
    return row;
  }),
);

/** Derivative at the nodes, per panel width, of the polynomial through `values` from `offset`, written into `slopes`. */
export function derivativeAtNodes(values: ArrayLike<number>, offset: number, slopes: Float64Array): Float64Array {
  for (let i = 0; i < NODE_COUNT; i += 1) {
    let slope = 0;
    for (let j = 0; j < NODE_COUNT; j += 1) slope += DIFFERENTIATION[i * NODE_COUNT + j] * values[offset + j];
    slopes[i] = slope;
  }
  return slopes;
}

/** Ascending coefficients of the polynomial through values at the nodes: coefficients = TAYLOR·values. */
export const TAYLOR = solve(
  matrixOf(Array.from(NODES, (node) => Array.from({ length: NODE_COUNT }, (_, k) => node ** k))),
  identityMatrix(NODE_COUNT),
);

/** Weights of ∫₀¹ for values at the nodes. */
export const QUADRATURE = Float64Array.from({ length: NODE_COUNT }, (_, j) => {
  let sum = 0;
  for (let k = 0; k < NODE_COUNT; k += 1) sum += TAYLOR.data[k * NODE_COUNT + j] / (k + 1);
  return sum;
});
