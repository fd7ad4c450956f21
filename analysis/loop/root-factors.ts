import type { Complex } from '@/analysis/numbers/complex';
import { LOG_SLOPE, multiplyIn, PHASE_SLOPE } from './turning-product';

/**
 * Factors (s − root) of a product, none at the origin, evaluated on s = jω without expanding anything and without
 * allocation. A factor with its root on the positive real axis is negated: every argument starts at 0 at ω = 0.
 *
 * A pair a ± jb is (a² − (ω − b)(ω + b)) − 2aω·j: the difference is taken before anything is squared, which keeps
 * relative accuracy at a weakly damped resonance. With a = 0 the argument jumps from 0 to +π, as numerics.md asks.
 */
export class RootFactors {
  private readonly real: Float64Array;
  private readonly pairRe: Float64Array;
  private readonly pairIm: Float64Array;

  constructor(roots: readonly Complex[]) {
    const upper = roots.filter((root) => root.im > 0);
    this.real = Float64Array.from(roots.filter((root) => root.im === 0).map((root) => root.re));
    this.pairRe = Float64Array.from(upper, (root) => root.re);
    this.pairIm = Float64Array.from(upper, (root) => root.im);
  }

  get isEmpty(): boolean {
    return this.real.length === 0 && this.pairRe.length === 0;
  }

  /** Multiplies every factor into the product, which keeps count of its turns. */
  multiplyInto(product: Float64Array, omega: number): void {
    const { real, pairRe, pairIm } = this;
    for (let i = 0; i < real.length; i += 1) {
      const root = real[i];
      multiplyIn(product, Math.abs(root), root < 0 ? omega : -omega);
    }
    for (let i = 0; i < pairRe.length; i += 1) {
      const a = pairRe[i];
      multiplyIn(product, a * a - (omega - pairIm[i]) * (omega + pairIm[i]), -2 * a * omega + 0);
    }
  }

  /** Adds the factors' derivatives to ln ω to the product's slopes. */
  addSlopes(product: Float64Array, omega: number): void {
    const { real, pairRe, pairIm } = this;
    for (let i = 0; i < real.length; i += 1) {
      const root = real[i];
      const share = omega / (omega * omega + root * root);
      product[LOG_SLOPE] += omega * share;
      product[PHASE_SLOPE] -= root * share;
    }
    for (let i = 0; i < pairRe.length; i += 1) {
      const a = pairRe[i];
      const re = a * a - (omega - pairIm[i]) * (omega + pairIm[i]);
      const im = -2 * a * omega;
      const share = (2 * omega) / (re * re + im * im);
      product[LOG_SLOPE] -= share * (omega * re + a * im);
      product[PHASE_SLOPE] -= share * (a * re - omega * im);
    }
  }
}
