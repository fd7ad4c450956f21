import type { Loop } from '@/contract';
import type { LoopModel, SampledRun } from '@/analysis/loop/model';
import { toParallelGains } from '@/analysis/loop/parallel-gains';
import { digitalFilter, type DigitalFilter } from './digital-filter';

/**
 * The controller as a control unit runs it, coefficients to full precision. With y the sample, r the reference, e = r − y and
 * d = derivativeWeight·r − y, each sample period does, in this order:
 *
 * 1. I ← I + integral.now·e + integral.before·(last e)
 * 2. D ← derivative.decay·D + derivative.gain·(d − last d)
 * 3. v = proportional·(proportionalWeight·r − y) + feedforward·r + I + D
 * 4. v through each filter: v ← Σ forward[i]·(v i samples ago) − Σ back[i]·(its own answer i + 1 samples ago)
 * 5. u = v within the actuator's limits, held until the next sample
 */
export interface DifferenceEquation {
  /** s */
  readonly period: number;
  readonly proportional: number;
  readonly proportionalWeight: number;
  readonly derivativeWeight: number;
  /** Command per unit of reference, static. */
  readonly feedforward: number;
  /** null: no integral action. */
  readonly integral: { readonly now: number; readonly before: number } | null;
  /** null: no derivative action. */
  readonly derivative: { readonly decay: number; readonly gain: number } | null;
  readonly filters: readonly DigitalFilter[];
}

type Sampling = NonNullable<Loop['sampling']>;

/** Shares of Ki·h that this error and the last one bring. */
const INTEGRAL = { backward: [1, 0], forward: [0, 1], trapezoidal: [0.5, 0.5] } as const;

/**
 * A design's difference equation. Ideal and series settings are converted to parallel gains first, exactly.
 *
 * @see REFERENCES numerics "Sampled loops"
 * @example of Kp 2, Ki 1 at 0.1 s by backward Euler: proportional 2, integral { now: 0.1, before: 0 }
 */
export const differenceEquation = (controller: Loop['controller'], sampling: Sampling): DifferenceEquation =>
  equationOf(
    { gains: toParallelGains(controller), weights: controller.setpointWeights, feedforwardGain: controller.feedforward.gain },
    { sampling, filters: controller.filters },
  );

/** The same from a loop that is built already. */
export const equationOf = (
  { gains: { kp, ki, kd, filterTime }, weights, feedforwardGain }: Pick<LoopModel, 'gains' | 'weights' | 'feedforwardGain'>,
  { sampling, filters }: Pick<SampledRun, 'sampling' | 'filters'>,
): DifferenceEquation => {
  const { period, integral } = sampling;
  const [now, before] = INTEGRAL[integral];
  return {
    period,
    proportional: kp,
    proportionalWeight: weights.proportional,
    derivativeWeight: weights.derivative,
    feedforward: feedforwardGain,
    integral: ki === 0 ? null : { now: ki * period * now, before: ki * period * before },
    derivative: kd === 0 ? null : derivativeOf(kd, filterTime, sampling),
    filters: filters.flatMap((filter) => digitalFilter(filter, period) ?? []),
  };
};

const derivativeOf = (kd: number, filterTime: number, { period, derivative }: Sampling) =>
  derivative === 'backward'
    ? { decay: filterTime / (filterTime + period), gain: kd / (filterTime + period) }
    : { decay: (2 * filterTime - period) / (2 * filterTime + period), gain: (2 * kd) / (2 * filterTime + period) };
