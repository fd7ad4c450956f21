import type { Probe } from './probe';
import type { Quantity } from './quantities';
import { IM, OMEGA, RE, ROW, type Table } from './sample';

/** The supremum of |something| over the axis. `frequency` null: only approached as ω → ∞. */
export interface Supremum {
  readonly value: number;
  readonly frequency: number | null;
}

/** Within this distance of −1 a peak may be far sharper than the rows beside it tell, so it is always looked for. */
const NEAR_CRITICAL = 0.7;
/** A peak inside the axis must stand out of what the ends tend to by more than rounding. */
const STANDS_OUT = 1e-12;

/**
 * The supremum of e^quantity: every turning point that could be the greatest is found exactly as a zero of the slope, and
 * compared with what the function tends to at both ends of the axis.
 */
export const supremum = (probe: Probe, quantity: Quantity, ends: { atZero: number; atInfinity: number }): Supremum => {
  const inside = greatest(probe, quantity);
  const value = Math.exp(inside.log);
  const limit = Math.max(ends.atZero, ends.atInfinity);
  if (value > limit * (1 + STANDS_OUT)) return { value, frequency: inside.omega };
  return { value: limit, frequency: ends.atZero >= ends.atInfinity * (1 - STANDS_OUT) ? 0 : null };
};

const greatest = (probe: Probe, quantity: Quantity): { log: number; omega: number } => {
  const { table, count } = probe;
  let log = -Infinity;
  let omega = 0;
  for (let i = 0; i < count; i += 1) {
    const value = quantity.value(table, i * ROW);
    if (value <= log) continue;
    log = value;
    omega = table[i * ROW + OMEGA];
  }
  for (let i = 0; i < count - 1; i += 1) {
    const row = i * ROW;
    const slopeA = quantity.slope(table, row);
    const slopeB = quantity.slope(table, row + ROW);
    if (!(slopeA > 0 && slopeB < 0) || probe.jumps(i)) continue;
    const a = table[row + OMEGA];
    const b = table[row + ROW + OMEGA];
    const width = Math.log(b / a);
    const reach = Math.min(quantity.value(table, row) + slopeA * width, quantity.value(table, row + ROW) - slopeB * width);
    if (reach < log && !nearCritical(table, row) && !nearCritical(table, row + ROW)) continue;
    const peak = probe.stationary(quantity, { a, slopeA, b, slopeB });
    const value = quantity.value(probe.row, 0);
    if (value <= log) continue;
    log = value;
    omega = peak;
  }
  return { log, omega };
};

const nearCritical = (table: Table, row: number): boolean => Math.hypot(1 + table[row + RE], table[row + IM]) < NEAR_CRITICAL;
