import type { Loop } from '@/contract';
import { withoutLeadingZeros } from '@/analysis/numbers/polynomial';
import { toParallelGains } from './parallel-gains';
import type { ParallelGains, Rational } from './model';
import { fromCoefficients, rootOfTime, timeFactor } from './rational';

type Controller = Loop['controller'];

/** A sum this much smaller than its terms is a gain that cancelled, not a gain. */
const CANCELLED = 8 * 2 ** -53;

/** The feedback controller C_y. The series form is a product already and stays one. */
export const buildController = (controller: Controller): Rational => {
  if (controller.form !== 'series') return fromGains(toParallelGains(controller));
  const { kp, ti, td, derivativeFilterTime: tf } = controller;
  const cancels = td === tf;
  return {
    gain: (kp * (cancels ? 1 : timeFactor(td))) / (cancels ? 1 : timeFactor(tf)),
    zeros: kp === 0 ? [] : [...(ti === null ? [] : rootOfTime(ti)), ...(cancels ? [] : rootOfTime(td))],
    poles: kp === 0 ? [] : [...(ti === null ? [] : [{ re: 0, im: 0 }]), ...(cancels ? [] : rootOfTime(tf))],
  };
};

/**
 * kp + ki/s + kd·s/(1 + s·tf) over its common denominator. Without derivative action tf has no effect, without integral
 * action there is no pole at the origin.
 */
export const fromGains = ({ kp, ki, kd, filterTime }: ParallelGains): Rational => {
  const tf = kd === 0 ? 0 : filterTime;
  const first = [sum(kp * tf, kd), sum(kp, ki * tf), ki];
  const numerator = ki === 0 ? first.slice(0, 2) : first;
  const denominator = ki === 0 ? [tf, 1] : [tf, 1, 0];
  return fromCoefficients(withoutLeadingZeros(numerator), denominator);
};

const sum = (a: number, b: number): number => (Math.abs(a + b) <= CANCELLED * (Math.abs(a) + Math.abs(b)) ? 0 : a + b);
