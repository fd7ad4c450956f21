import { columnNorm, identityMatrix, multiply, weightedSum, type Matrix } from './matrix';
import { solve } from './matrix-solve';

/** Coefficients of the numerator of the [13/13] Padé approximant of eˣ, ascending. */
const PADE = [
  64764752532480000, 32382376266240000, 7771770303897600, 1187353796428800, 129060195264000, 10559470521600, 670442572800, 33522128640,
  1323241920, 40840800, 960960, 16380, 182, 1,
];

/** Up to this norm the approximant is exact to double precision. */
const PADE_REACH = 5.371920351148152;

/**
 * e^A by scaling and squaring with the [13/13] Padé approximant.
 *
 * What is squared is e^A − I, by E ← 2E + E²: beside a fast mode, a slow one would otherwise drown in the rounding of the
 * ones on the diagonal. `a` is square and finite; balance it first where its entries differ by many decades.
 * Example: exponential of [[0, 1], [−1, 0]] has cos 1 = 0.5403023058681398 on its diagonal.
 *
 * @see REFERENCES.md [Higham 2005], algorithm 2.3
 */
export function exponential(a: Matrix): Matrix {
  const squarings = Math.max(0, Math.ceil(Math.log2(columnNorm(a) / PADE_REACH)));
  let change = padeChange(weightedSum([[2 ** -squarings, a]]));
  for (let k = 0; k < squarings; k += 1) change = weightedSum([[2, change], [1, multiply(change, change)]]); // prettier-ignore
  return weightedSum([[1, change], [1, identityMatrix(a.rows)]]); // prettier-ignore
}

/** e^A − I of a matrix within the approximant's reach. */
function padeChange(a: Matrix): Matrix {
  const b = PADE;
  const one = identityMatrix(a.rows);
  const a2 = multiply(a, a);
  const a4 = multiply(a2, a2);
  const a6 = multiply(a4, a2);
  const oddHigh = multiply(a6, weightedSum([[b[13], a6], [b[11], a4], [b[9], a2]])); // prettier-ignore
  const odd = multiply(a, weightedSum([[1, oddHigh], [b[7], a6], [b[5], a4], [b[3], a2], [b[1], one]])); // prettier-ignore
  const evenHigh = multiply(a6, weightedSum([[b[12], a6], [b[10], a4], [b[8], a2]])); // prettier-ignore
  const even = weightedSum([[1, evenHigh], [b[6], a6], [b[4], a4], [b[2], a2], [b[0], one]]); // prettier-ignore
  return solve(weightedSum([[1, even], [-1, odd]]), weightedSum([[2, odd]])); // prettier-ignore
}
