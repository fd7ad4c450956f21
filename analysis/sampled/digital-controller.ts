import type { Loop } from '@/contract';
import { buildFilters } from '@/analysis/loop/filters';
import type { ParallelGains, Rational } from '@/analysis/loop/model';
import { fromCoefficients } from '@/analysis/loop/rational';
import { withoutLeadingZeros } from '@/analysis/numbers/polynomial';

type Sampling = NonNullable<Loop['sampling']>;
type Filter = Loop['controller']['filters'][number];

/** What stands beside Ki·h/(2v) for each rule: z/(z − 1), 1/(z − 1) and (z + 1)/(z − 1)/2 are all (1 + σ·v)/(2v). */
const INTEGRAL = { backward: 1, forward: -1, trapezoidal: 0 };
/** The filtered derivative is 2·Kd·v/(h + (2·Tf + ρ·h)·v) by either rule. */
const DERIVATIVE = { backward: 1, trapezoidal: 0 };

/** A sum this much smaller than its terms is a gain that cancelled, not a gain. */
const CANCELLED = 8 * 2 ** -53;

/**
 * The controller's difference equation as a function of v = (z − 1)/(z + 1).
 *
 * @see REFERENCES numerics "Sampled loops"
 */
export const digitalController = ({ kp, ki, kd, filterTime }: ParallelGains, { period: h, integral, derivative }: Sampling): Rational => {
  const sigma = INTEGRAL[integral];
  const lag = kd === 0 ? 0 : 2 * filterTime + DERIVATIVE[derivative] * h;
  const proper = kd === 0 ? 1 : h;
  const second = sum(2 * kp * lag, sigma * ki * h * lag, 4 * kd);
  const first = sum(2 * kp * proper, ki * h * lag, sigma * ki * h * proper);
  if (ki === 0) return fromCoefficients(withoutLeadingZeros([second, first]), withoutLeadingZeros([2 * lag, 2 * proper]));
  const numerator = withoutLeadingZeros([second, first, ki * h * proper]);
  return fromCoefficients(numerator, withoutLeadingZeros([2 * lag, 2 * proper, 0]));
};

const sum = (...terms: readonly number[]): number => {
  const total = terms.reduce((a, b) => a + b, 0);
  return Math.abs(total) <= CANCELLED * terms.reduce((a, b) => a + Math.abs(b), 0) ? 0 : total;
};

/**
 * The filters by the trapezoidal rule, s = 2v/h, as a function of v: a filter of the same kind with its times counted in
 * half periods. A notch is pre-warped, so that its centre stays where it was asked for.
 */
export const digitalFilters = (filters: readonly Filter[], period: number): Rational =>
  buildFilters(filters.map((filter) => inHalfPeriods(filter, period / 2)));

const inHalfPeriods = (filter: Filter, half: number): Filter => {
  if (filter.kind === 'lowPass') return { ...filter, timeConstant: filter.timeConstant / half };
  if (filter.kind === 'leadLag') return { ...filter, zeroTime: filter.zeroTime / half, poleTime: filter.poleTime / half };
  return { ...filter, frequency: Math.tan(filter.frequency * half) };
};
