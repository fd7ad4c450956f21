import type { LoopModel, Rational, SampledRun } from '@/analysis/loop/model';
import { digitalController, digitalFilters } from './digital-controller';
import { HeldPlant } from './held-plant';
import { bilinearRoot, inV, mapRoots } from './planes';
import { pulseTransfer, type PulseTransfer } from './pulse-transfer';
import { refuseUnsampled } from './refuse-unsampled';
import { splitDelay } from './split-delay';

/** A function of v = (z − 1)/(z + 1) behind whole periods of delay. */
export interface DelayedInV {
  readonly rational: Rational;
  readonly periods: number;
}

/** One sampled loop: L(z) = plant·controller·filters, the plant with sensor, every delay and the hold. */
export interface SampledModel {
  readonly period: number;
  /** Delay of the whole loop: plant, sensor and computation, s. */
  readonly delay: number;
  /** Plant and sensor behind the hold, without delay: what every delay's equivalent comes from. */
  readonly held: HeldPlant;
  /** What the computer sees: plant, sensor and the whole delay, in w = z − 1. */
  readonly seen: PulseTransfer;
  /** The same in v. */
  readonly loopPlant: DelayedInV;
  /** The plant's own output at the samples, with its dead time and the computation's, in v. */
  readonly plant: DelayedInV;
  readonly controller: Rational;
  /** C_r + F in v. */
  readonly forward: Rational;
  readonly filters: Rational;
}

/**
 * The loop as the computer runs it, from the same parts as the continuous one.
 * @throws LoopError where a sampled loop has no meaning: a notch beyond half the sampling frequency, an endless delay
 */
export const sampledModel = (model: LoopModel, run: SampledRun): SampledModel => {
  const { sampling, filters } = run;
  refuseUnsampled(model, run);
  const { period, computationDelay } = sampling;
  const { gains, weights, feedforwardGain } = model;
  const hasSensor = model.sensor.poles.length > 0 || model.sensorDeadTime > 0;
  const delay = model.plantDeadTime + model.sensorDeadTime + computationDelay;
  const held = new HeldPlant([model.plant, model.sensor], period);
  const seen = pulseTransfer(held, splitDelay(delay, period));
  const loopPlant = delayedInV(seen, [model.plant, model.sensor], period);
  const outputDelay = splitDelay(model.plantDeadTime + computationDelay, period);
  const plant = hasSensor ? delayedInV(pulseTransfer(new HeldPlant([model.plant], period), outputDelay), [model.plant], period) : loopPlant;
  const command = { ...gains, kp: gains.kp * weights.proportional + feedforwardGain, kd: gains.kd * weights.derivative };
  return {
    period,
    delay,
    held,
    seen,
    loopPlant,
    plant,
    controller: digitalController(gains, sampling),
    forward: digitalController(command, sampling),
    filters: digitalFilters(filters, period),
  };
};

const delayedInV = ({ rational, periods }: PulseTransfer, parts: readonly Rational[], period: number): DelayedInV => ({
  rational: inV(
    rational,
    mapRoots(
      parts.flatMap((part) => part.poles),
      (root) => bilinearRoot(root, period),
    ),
  ),
  periods,
});
