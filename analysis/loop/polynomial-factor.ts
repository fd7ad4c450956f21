import type { Complex } from '@/analysis/numbers/complex';
import { RootFactors } from './root-factors';
import { IM, LOG_SLOPE, multiplyIn, PHASE_SLOPE, RE, startProduct, TURNS, WIDTH } from './turning-product';

const SIGNS = [1, 1, -1, -1];

/** Up to this degree the argument stays on one side of the real axis, all the way from 0 at ω = 0. */
const NEVER_TURNS = 2;

/**
 * A polynomial that was given by its coefficients, evaluated by Horner's rule; its roots serve only to count turns.
 * The constant term is positive, so that the argument starts at 0.
 */
export class PolynomialFactor {
  /** Σ cₖ·(jω)ᵏ = even(ω²) + jω·odd(ω²), ascending. */
  private readonly even: Float64Array;
  private readonly odd: Float64Array;
  private readonly roots: RootFactors | null;
  private readonly counted = new Float64Array(WIDTH);

  constructor(ascending: readonly number[], roots: readonly Complex[]) {
    const signed = ascending.map((c, k) => c * SIGNS[k % 4]);
    this.even = Float64Array.from(signed.filter((_, k) => k % 2 === 0));
    this.odd = Float64Array.from(signed.filter((_, k) => k % 2 === 1));
    this.roots = roots.length > NEVER_TURNS ? new RootFactors(roots) : null;
  }

  /** Multiplies the polynomial into the product and adds its derivative to ln ω, which has k·cₖ in the place of cₖ. */
  multiplyInto(product: Float64Array, omega: number): void {
    const { even, odd } = this;
    const square = omega * omega;
    let re = 0;
    let slopeRe = 0;
    for (let k = even.length - 1; k >= 0; k -= 1) {
      re = re * square + even[k];
      slopeRe = slopeRe * square + 2 * k * even[k];
    }
    let im = 0;
    let slopeIm = 0;
    for (let k = odd.length - 1; k >= 0; k -= 1) {
      im = im * square + odd[k];
      slopeIm = slopeIm * square + (2 * k + 1) * odd[k];
    }
    im = im * omega + 0;
    slopeIm *= omega;
    const share = 1 / (re * re + im * im);
    product[LOG_SLOPE] += (slopeRe * re + slopeIm * im) * share;
    product[PHASE_SLOPE] += (slopeIm * re - slopeRe * im) * share;
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
