import type { Complex } from '@/analysis/numbers/complex';
import { LOG_SLOPE, multiplyIn, PHASE_SLOPE } from './turning-product';

/**
 * Factors (s − root) of a product, none at the origin, evaluated on s = jω without expanding anything and without
 * allocation. A factor with its root on the positive real axis is negated: every argument starts at 0 at ω = 0.
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

  /**
   * A pair a ± jb is (a² − (ω − b)(ω + b)) − 2aω·j: the difference is taken before anything is squared, which keeps
   * relative accuracy at a weakly damped resonance. With a = 0 the argument jumps from 0 to +π, as numerics.md asks.
   */
  multiplyInto(product: Float64Array, omega: number): void {
    const { real, pairRe, pairIm } = this;
    for (let i = 0; i < real.length; i += 1) {
      const root = real[i];
      const length = omega * omega + root * root;
      product[LOG_SLOPE] += (omega * omega) / length;
      product[PHASE_SLOPE] -= (omega * root) / length;
      multiplyIn(product, Math.abs(root), root < 0 ? omega : -omega);
    }
    for (let i = 0; i < pairRe.length; i += 1) {
      const a = pairRe[i];
      const re = a * a - (omega - pairIm[i]) * (omega + pairIm[i]);
      const im = -2 * a * omega + 0;
      const length = re * re + im * im;
      product[LOG_SLOPE] -= (2 * omega * (omega * re + a * im)) / length;
      product[PHASE_SLOPE] -= (2 * omega * (a * re - omega * im)) / length;
      multiplyIn(product, re, im);
    }
  }
}
