import { addProduct, columnNorm, zeroMatrix, type Matrix } from './matrix';
import { solveInPlace } from './matrix-solve';

/** Coefficients of the numerator of the [7/7] Padé approximant of eˣ, ascending. */
const PADE = [17297280, 8648640, 1995840, 277200, 25200, 1512, 56, 1];

/** Up to this norm it is exact to double precision. */
const REACH = 0.9504178996162932;

/**
 * e^A by scaling and squaring with a Padé approximant. `a` is square and finite; balance it first where its entries differ by
 * many decades.
 * Example: exponential of [[0, 1], [−1, 0]] has cos 1 = 0.5403023058681398 on its diagonal.
 *
 * @see REFERENCES.md [Higham 2005], algorithm 2.3
 */
export function exponential(a: Matrix): Matrix {
  const [change] = new ExponentialChanges(a.rows, [1]).of(a);
  for (let i = 0; i < a.rows; i += 1) change.data[i * (a.rows + 1)] += 1;
  return change;
}

/**
 * e^(share·A) − I for each of some shares, which have the powers of A in common; for one matrix of an order after the other in
 * the same room.
 *
 * The difference from I is what is computed and squared, by E ← 2E + E²: beside a fast mode, a slow one would otherwise
 * drown in the rounding of the ones on the diagonal.
 */
export class ExponentialChanges {
  private readonly changes: Matrix[];
  private readonly scaled: Matrix;
  /** A², A⁴ and A⁶ of the scaled matrix. */
  private readonly powers: readonly [Matrix, Matrix, Matrix];
  private readonly odd: Matrix;
  private readonly left: Matrix;
  private readonly spare: Matrix;

  /** @param shares positive */
  constructor(
    order: number,
    private readonly shares: readonly number[],
  ) {
    const room = () => zeroMatrix(order, order);
    this.changes = shares.map(room);
    this.scaled = room();
    this.powers = [room(), room(), room()];
    this.odd = room();
    this.left = room();
    this.spare = room();
  }

  /** The changes of one matrix, valid until others are asked for. */
  of(a: Matrix): readonly Matrix[] {
    const { scaled, powers, shares } = this;
    const norm = columnNorm(a);
    const halvings = norm > 0 ? Math.ceil(Math.log2(norm)) : 0;
    for (let i = 0; i < a.data.length; i += 1) scaled.data[i] = a.data[i] * 2 ** -halvings;
    product(scaled, scaled, powers[0]);
    product(powers[0], powers[0], powers[1]);
    product(powers[1], powers[0], powers[2]);
    shares.forEach((share, k) => {
      const squarings = Math.max(0, Math.ceil(Math.log2((norm * share) / REACH)));
      this.approximate(share * 2 ** (halvings - squarings), this.changes[k]);
      this.square(this.changes[k], squarings);
    });
    return this.changes;
  }

  /** The changes of the last matrix times a power of two. */
  doubled(times: number): readonly Matrix[] {
    for (const change of this.changes) this.square(change, times);
    return this.changes;
  }

  /** e^(x·A) − I of the scaled matrix where its norm is within reach: 2·(even − odd)⁻¹·odd of the approximant's numerator. */
  private approximate(x: number, change: Matrix): void {
    const { scaled, odd, left, spare } = this;
    this.combine(x, 1, spare);
    product(scaled, spare, odd);
    this.combine(x, 0, left);
    for (let i = 0; i < odd.data.length; i += 1) {
      const part = x * odd.data[i];
      left.data[i] -= part;
      change.data[i] = 2 * part;
    }
    solveInPlace(left, change);
  }

  /** b[from]·I + b[from + 2]·(xA)² + b[from + 4]·(xA)⁴ + b[from + 6]·(xA)⁶. */
  private combine(x: number, from: number, sum: Matrix): void {
    const [second, fourth, sixth] = this.powers;
    const square = x * x;
    const [u, v, w] = [PADE[from + 2] * square, PADE[from + 4] * square * square, PADE[from + 6] * square * square * square];
    for (let i = 0; i < sum.data.length; i += 1) sum.data[i] = u * second.data[i] + v * fourth.data[i] + w * sixth.data[i];
    for (let i = 0; i < sum.rows; i += 1) sum.data[i * (sum.rows + 1)] += PADE[from];
  }

  private square(change: Matrix, times: number): void {
    const { spare } = this;
    for (let k = 0; k < times; k += 1) {
      for (let i = 0; i < change.data.length; i += 1) spare.data[i] = 2 * change.data[i];
      addProduct(change, change, spare);
      change.data.set(spare.data);
    }
  }
}

/** (I + a)·(I + b) − I. */
export function chained(a: Matrix, b: Matrix): Matrix {
  const chain = zeroMatrix(a.rows, a.columns);
  for (let i = 0; i < chain.data.length; i += 1) chain.data[i] = a.data[i] + b.data[i];
  addProduct(a, b, chain);
  return chain;
}

function product(a: Matrix, b: Matrix, into: Matrix): void {
  into.data.fill(0);
  addProduct(a, b, into);
}
