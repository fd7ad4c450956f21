import { columnNorm, multiply, scaledBy, zeroMatrix, type Matrix } from './matrix';
import { solve } from './matrix-solve';

/** Coefficients of the numerators of the [7/7] and [13/13] Padé approximants of eˣ, ascending. */
const PADE_7 = [17297280, 8648640, 1995840, 277200, 25200, 1512, 56, 1];
const PADE_13 = [
  64764752532480000, 32382376266240000, 7771770303897600, 1187353796428800, 129060195264000, 10559470521600, 670442572800, 33522128640,
  1323241920, 40840800, 960960, 16380, 182, 1,
];

/** Up to these norms the approximants are exact to double precision. */
const REACH_7 = 0.9504178996162932;
const REACH_13 = 5.371920351148152;

/**
 * e^A by scaling and squaring with Padé approximants. `a` is square and finite; balance it first where its entries differ by
 * many decades.
 * Example: exponential of [[0, 1], [−1, 0]] has cos 1 = 0.5403023058681398 on its diagonal.
 *
 * @see REFERENCES.md [Higham 2005], algorithm 2.3
 */
export function exponential(a: Matrix): Matrix {
  const [change] = exponentialChanges(a, [1]);
  for (let i = 0; i < a.rows; i += 1) change.data[i * (a.rows + 1)] += 1;
  return change;
}

/**
 * e^(share·A) − I for each of some shares from 0 to 1, which have the powers of A in common.
 *
 * The difference from I is what is computed and squared, by E ← 2E + E²: beside a fast mode, a slow one would otherwise
 * drown in the rounding of the ones on the diagonal.
 */
export function exponentialChanges(a: Matrix, shares: readonly number[]): Matrix[] {
  const norm = columnNorm(a);
  const squarings = Math.max(0, Math.ceil(Math.log2((norm * Math.max(...shares)) / REACH_13)));
  const scaled = scaledBy(a, 2 ** -squarings);
  const square = multiply(scaled, scaled);
  const fourth = multiply(square, square);
  const powers: EvenPowers = [square, fourth, multiply(fourth, square)];
  return shares.map((share) => {
    let change = padeChange(scaled, powers, { share, norm: norm * share * 2 ** -squarings });
    for (let k = 0; k < squarings; k += 1) change = chained(change, change);
    return change;
  });
}

/** (I + a)·(I + b) − I. */
export function chained(a: Matrix, b: Matrix): Matrix {
  const product = multiply(a, b);
  for (let i = 0; i < product.data.length; i += 1) product.data[i] += a.data[i] + b.data[i];
  return product;
}

/** A², A⁴, A⁶. */
type EvenPowers = readonly [Matrix, Matrix, Matrix];

/** e^(share·A) − I where the norm of share·A is within reach: 2·(even − odd)⁻¹·odd of the approximant's numerator. */
function padeChange(a: Matrix, powers: EvenPowers, { share, norm }: { share: number; norm: number }): Matrix {
  const b = norm <= REACH_7 ? PADE_7 : PADE_13;
  const x = share * share;
  /** b[from] + b[from + 2]·A² + … + b[from + 6]·A⁶ at the share, and for the longer approximant A⁶ times as much again. */
  const half = (from: number): Matrix => {
    const weights = (k: number) => [b[k] * x, b[k + 2] * x ** 2, b[k + 4] * x ** 3] as const;
    const low = combination(powers, weights(from + 2), b[from]);
    if (b === PADE_7) return low;
    return plus(low, multiply(powers[2], combination(powers, weights(from + 8), 0)), x ** 3);
  };
  const even = half(0);
  const odd = multiply(a, half(1));
  const [left, right] = [zeroMatrix(a.rows, a.rows), zeroMatrix(a.rows, a.rows)];
  for (let i = 0; i < odd.data.length; i += 1) {
    left.data[i] = even.data[i] - share * odd.data[i];
    right.data[i] = 2 * share * odd.data[i];
  }
  return solve(left, right);
}

/** Σ weightₖ·powerₖ + constant·I. */
function combination([a, b, c]: EvenPowers, [u, v, w]: readonly [number, number, number], constant: number): Matrix {
  const sum = zeroMatrix(a.rows, a.rows);
  for (let i = 0; i < sum.data.length; i += 1) sum.data[i] = u * a.data[i] + v * b.data[i] + w * c.data[i];
  for (let i = 0; i < a.rows; i += 1) sum.data[i * (a.rows + 1)] += constant;
  return sum;
}

/** a + weight·b, in the place of a. */
function plus(a: Matrix, b: Matrix, weight: number): Matrix {
  for (let i = 0; i < a.data.length; i += 1) a.data[i] += weight * b.data[i];
  return a;
}
