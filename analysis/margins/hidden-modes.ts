import type { Rational } from '@/analysis/loop/model';
import type { Complex } from '@/analysis/numbers/complex';

/** A pole and a zero nearer than this, relatively, cancel. */
const SAME = 1e-9;

/**
 * Poles with Re s ≥ 0 that a zero of the same loop cancels. The loop gain does not show them, the system still has them.
 * A conjugate pair counts as two.
 */
export const hiddenModes = (parts: readonly Rational[]): Complex[] => {
  const zeros = parts.flatMap((part) => part.zeros);
  return parts
    .flatMap((part) => part.poles)
    .filter((pole) => {
      if (pole.re < 0) return false;
      const match = zeros.findIndex((zero) => Math.hypot(zero.re - pole.re, zero.im - pole.im) <= SAME * Math.hypot(pole.re, pole.im));
      if (match >= 0) zeros.splice(match, 1);
      return match >= 0;
    });
};
