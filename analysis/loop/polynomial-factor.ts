import type { Complex } from '@/analysis/numbers/complex';
import { RootFactors } from './root-factors';
import { IM, LOG_SLOPE, multiplyIn, PHASE_SLOPE, RE, startProduct, TURNS, WIDTH } from './turning-product';

/** The real and imaginary part of Σ cₖ·(jω)ᵏ as two real polynomials in ω². */
interface Halves {
  readonly even: Float64Array;
  readonly odd: Float64Array;
}

const SIGNS = [1, 1, -1, -1];

/** Up to this degree the argument stays on one side of the real axis, all the way from 0 at ω = 0. */
const NEVER_TURNS = 2;

const halves = (ascending: readonly number[]): Halves => {
  const signed = ascending.map((c, k) => c * SIGNS[k % 4]);
  return { even: Float64Array.from(signed.filter((_, k) => k % 2 === 0)), odd: Float64Array.from(signed.filter((_, k) => k % 2 === 1)) };
};

const horner = (ascending: Float64Array, x: number): number => {
  let value = 0;
  for (let k = ascending.length - 1; k >= 0; k -= 1) value = value * x + ascending[k];
  return value;
};

/**
 * A polynomial that was given by its coefficients, evaluated by Horner's rule; its roots serve only to count turns.
 * The constant term is positive, so that the argument starts at 0.
 */
export class PolynomialFactor {
  private readonly value: Halves;
  private readonly slope: Halves;
  private readonly roots: RootFactors | null;
  private readonly counted = new Float64Array(WIDTH);

  constructor(ascending: readonly number[], roots: readonly Complex[]) {
    this.value = halves(ascending);
    this.slope = halves(ascending.map((c, k) => c * k));
    this.roots = roots.length > NEVER_TURNS ? new RootFactors(roots) : null;
  }

  multiplyInto(product: Float64Array, omega: number): void {
    const square = omega * omega;
    const re = horner(this.value.even, square);
    const im = omega * horner(this.value.odd, square) + 0;
    const slopeRe = horner(this.slope.even, square);
    const slopeIm = omega * horner(this.slope.odd, square);
    const length = re * re + im * im;
    product[LOG_SLOPE] += (slopeRe * re + slopeIm * im) / length;
    product[PHASE_SLOPE] += (slopeIm * re - slopeRe * im) / length;
    multiplyIn(product, re, im);
    if (this.roots) product[TURNS] += this.turnsAt(this.roots, omega, re, im);
  }

  /** Whole turns of this factor: those of its roots, corrected where rounding put the two on different sides of the cut. */
  private turnsAt(roots: RootFactors, omega: number, re: number, im: number): number {
    startProduct(this.counted);
    roots.multiplyInto(this.counted, omega);
    const difference = this.counted[IM] >= 0 !== im >= 0 && re < 0 && this.counted[RE] < 0 ? (im >= 0 ? -1 : 1) : 0;
    return this.counted[TURNS] + difference;
  }
}
