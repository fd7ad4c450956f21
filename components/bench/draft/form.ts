import { gainsInForm, toParallelGains } from '@/analysis';
import { controllerOf, type Form, type Gains, startSettings } from './settings';

export const forms: readonly Form[] = ['parallel', 'ideal', 'series'];

export const formNames: Readonly<Record<Form, string>> = { parallel: 'Parallel', ideal: 'Ideal', series: 'Series' };

export const formEquations: Readonly<Record<Form, string>> = {
  parallel: 'Kp + Ki/s + Kd·s/(1 + s·Tf)',
  ideal: 'Kp·(1 + 1/(Ti·s) + Td·s/(1 + s·Tf))',
  series: 'Kp·(1 + 1/(Ti·s))·(1 + Td·s)/(1 + s·Tf)',
};

export type Written = { readonly gains: Gains } | { readonly refusal: string };

/** Relative: two gains nearer than this differ by the rounding of a conversion. */
const SAME = 1e-12;

export const sameGain = (a: number | null, b: number | null): boolean =>
  a === null || b === null ? a === b : Math.abs(a - b) <= SAME * Math.max(Math.abs(a), Math.abs(b));

const parallelOf = (gains: Gains) => toParallelGains(controllerOf({ ...startSettings, ...gains }));

/** The same controller in another form, exactly, or why that form cannot say it. In its own form it stays as it is. */
export function writtenIn(form: Form, gains: Gains): Written {
  const { kp, integral, derivative, filterTime } = gains;
  if (form === gains.form) return { gains: { form, kp, integral, derivative, filterTime } };
  const parallel = parallelOf(gains);
  if (form === 'parallel')
    return { gains: { form, kp: parallel.kp, integral: parallel.ki, derivative: parallel.kd, filterTime: parallel.filterTime } };
  const timed = gainsInForm(parallel, form);
  if ('refusal' in timed) return timed;
  const { ti, td, ...rest } = timed.gains;
  return { gains: { form, ...rest, integral: ti, derivative: td } };
}

/**
 * The gains for a switch of form. Where that leads back to the form that was kept, and to the same controller, they are the kept
 * gains to the last digit: there and back again is no move.
 */
export function switchedTo(form: Form, gains: Gains, kept: Gains): Written {
  const written = writtenIn(form, gains);
  if ('refusal' in written || kept.form !== form) return written;
  const { kp, integral, derivative, filterTime } = kept;
  const same =
    sameGain(kp, written.gains.kp) &&
    sameGain(integral, written.gains.integral) &&
    sameGain(derivative, written.gains.derivative) &&
    sameGain(filterTime, written.gains.filterTime);
  return same ? { gains: { form, kp, integral, derivative, filterTime } } : written;
}
