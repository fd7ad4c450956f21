import type { Controller } from '@/contract';
import type { ParallelGains } from './model';

/** The same controller with times instead of gains: ideal or series. `ti` null means no integral action. */
export interface TimedGains {
  readonly kp: number;
  readonly ti: number | null;
  readonly td: number;
  readonly filterTime: number;
}

/** Gains written in another form, or why they cannot be. */
export type Rewritten = { readonly gains: TimedGains } | { readonly refusal: string };

const NO_PROPORTIONAL = 'Without a proportional gain there is nothing that the times could multiply.';

/**
 * Parallel gains as Kp·(1 + 1/(Ti·s) + Td·s/(1 + s·Tf)). Exact wherever Kp is not 0; a time comes out negative where the gains differ
 * in sign, which the ideal form cannot say.
 */
function ideal({ kp, ki, kd, filterTime }: ParallelGains): Rewritten {
  if (kp === 0) return { refusal: NO_PROPORTIONAL };
  const ti = ki === 0 ? null : kp / ki;
  const td = kd / kp;
  if ((ti !== null && ti < 0) || td < 0) return { refusal: 'Ti or Td would be negative: the gains differ in sign.' };
  return { gains: { kp, ti, td: td === 0 ? 0 : td, filterTime } };
}

/** (Kp + Kd·s/(1 + s·Tf)) as Kp·(1 + Td·s)/(1 + s·Tf). */
function seriesWithoutIntegral({ kp, kd, filterTime }: ParallelGains): Rewritten {
  if (kp === 0) return { refusal: NO_PROPORTIONAL };
  const td = filterTime + kd / kp;
  if (td < 0) return { refusal: 'The zero of the controller stands in the right half-plane: the series form has none there.' };
  return { gains: { kp, ti: null, td, filterTime } };
}

/**
 * Parallel gains as Kp·(1 + 1/(Ti·s))·(1 + Td·s)/(1 + s·Tf), the larger time as Ti. Over s·(1 + s·Tf) the numerators must agree:
 * Ti + Td = (Kp + Ki·Tf)/Ki and Ti·Td = (Kp·Tf + Kd)/Ki, so both zeros must be real and in the left half-plane.
 */
function series(gains: ParallelGains): Rewritten {
  // In parallel form Tf has no effect without derivative action; in series form it would filter the whole PI.
  const filterTime = gains.kd === 0 ? 0 : gains.filterTime;
  if (gains.ki === 0) return seriesWithoutIntegral({ ...gains, filterTime });
  const sum = (gains.kp + gains.ki * filterTime) / gains.ki;
  const product = (gains.kp * filterTime + gains.kd) / gains.ki;
  const discriminant = sum * sum - 4 * product;
  if (discriminant < 0) return { refusal: 'The zeros of the controller are a complex pair: the series form has real ones only.' };
  if (!(sum > 0) || product < 0)
    return { refusal: 'A zero of the controller is not in the left half-plane: the series form has none there.' };
  const ti = (sum + Math.sqrt(discriminant)) / 2;
  // Through the product, because the difference of two nearly equal numbers would lose the smaller time.
  return { gains: { kp: gains.ki * ti, ti, td: product / ti, filterTime } };
}

/**
 * Parallel gains written as ideal or series ones, exactly, or the reason why that form cannot say them.
 *
 * @see REFERENCES numerics "PID forms"
 * @example gainsInForm({ kp: 2.5, ki: 2, kd: 0.5, filterTime: 0 }, 'series') // { gains: { kp: 2, ti: 1, td: 0.25, filterTime: 0 } }
 */
export const gainsInForm = (gains: ParallelGains, form: Exclude<Controller['form'], 'parallel'>): Rewritten =>
  form === 'ideal' ? ideal(gains) : series(gains);
