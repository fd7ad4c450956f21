import type { Probe } from './probe';
import { sensitivity, type Quantity } from './quantities';

/** The supremum of |something| over the axis. `frequency` null: only approached as ω → ∞. */
export interface Supremum {
  readonly value: number;
  readonly frequency: number | null;
}

/** Within 0.7 of −1, that is above this ln|S|, a peak may be far sharper than the rows beside it tell: it is always looked for. */
const NEAR_CRITICAL = -Math.log(0.7);
/** A peak inside the axis must stand out of what the ends tend to by more than rounding. */
const STANDS_OUT = 1e-12;

/**
 * The supremum of e^quantity: every turning point that could be the greatest is found exactly as a zero of the slope, and
 * compared with what the function tends to at both ends of the axis.
 */
export const supremum = (probe: Probe, quantity: Quantity, ends: { atZero: number; atEnd: number; end: number | null }): Supremum => {
  const inside = greatest(probe, quantity);
  const value = Math.exp(inside.log);
  const limit = Math.max(ends.atZero, ends.atEnd);
  if (value > limit * (1 + STANDS_OUT)) return { value, frequency: inside.omega };
  return { value: limit, frequency: ends.atZero >= ends.atEnd * (1 - STANDS_OUT) ? 0 : ends.end };
};

const greatest = (probe: Probe, quantity: Quantity): { log: number; omega: number } => {
  let log = -Infinity;
  let omega = 0;
  for (let i = 0; i < probe.count; i += 1) {
    const value = probe.valueAt(i, quantity);
    if (value <= log) continue;
    log = value;
    omega = probe.frequencyAt(i);
  }
  for (let i = 0; i < probe.count - 1; i += 1) {
    const slopeA = probe.slopeAt(i, quantity);
    const slopeB = probe.slopeAt(i + 1, quantity);
    if (!(slopeA > 0 && slopeB < 0) || probe.jumps(i)) continue;
    const width = Math.log(probe.frequencyAt(i + 1) / probe.frequencyAt(i));
    const reach = Math.min(probe.valueAt(i, quantity) + slopeA * width, probe.valueAt(i + 1, quantity) - slopeB * width);
    if (reach < log && !nearCritical(probe, i) && !nearCritical(probe, i + 1)) continue;
    const peak = probe.stationary(quantity, i);
    const value = probe.found[quantity];
    if (value <= log) continue;
    log = value;
    omega = peak;
  }
  return { log, omega };
};

const nearCritical = (probe: Probe, i: number): boolean => probe.valueAt(i, sensitivity) > NEAR_CRITICAL;
