import type { Complex } from '@/analysis/numbers/complex';
import type { LoopModel, Rational } from '@/analysis/loop/model';
import { Assembly, combine, type Signal } from './assembly';
import { assembleSystem, type LoopSystem } from './loop-system';

const REFERENCE = 0;
const LOAD = 1;
const MEASURED = 2;
const INPUTS = 3;

/**
 * The loop as state equations with one dead time, or null where a dead-time-free algebraic loop has no solution (L(∞) = −1).
 *
 * The chain runs from reference, load and delayed measurement to control, plant output and measurement. Because a dead
 * time commutes with H, both dead times stand together between measurement and controller, where the signal is smoothest;
 * the output is then only shifted by the plant's own. A controller without gains closes no loop, and no dead time is in it.
 */
export function linearLoop(model: LoopModel): LoopSystem | null {
  const { gains, weights, filters } = model;
  const integral = integralPath(model);
  const derivative = derivativePath(model);
  const assembly = new Assembly(openLoopPoles(model).length, INPUTS);
  const feed = (block: Rational, signal: Signal) => (block.gain === 0 ? combine([0, signal]) : assembly.feed(block, signal));
  const reference = assembly.input(REFERENCE);
  const measured = assembly.input(MEASURED);

  const integralPart = feed(integral, combine([1, reference], [-1, measured]));
  const derivativePart = feed(derivative.block, combine([weights.derivative, reference], [-1, measured]));
  const proportionalPart = combine([gains.kp * weights.proportional + model.feedforwardGain, reference], [-gains.kp, measured]);
  const unfiltered = combine([1, proportionalPart], [1, integralPart], [derivative.afterFilters ? 0 : 1, derivativePart]);
  const control = combine([1, feed(filters, unfiltered)], [derivative.afterFilters ? 1 : 0, derivativePart]);
  const output = feed(model.plant, combine([1, control], [1, assembly.input(LOAD)]));
  const measurement = feed(model.sensor, output);
  const deadTime = feedsBack(model) ? model.plantDeadTime + model.sensorDeadTime : 0;
  return assembleSystem({ derivatives: assembly.derivatives, output, control, measurement }, deadTime);
}

/** Whether the controller listens to the measurement at all. */
const feedsBack = ({ gains: { kp, ki, kd } }: LoopModel): boolean => kp !== 0 || ki !== 0 || kd !== 0;

/** Whether a reference step moves anything: without integral action, set-point weights and feedforward may leave nothing. */
export function answersReference({ gains: { kp, ki, kd }, weights, feedforwardGain }: LoopModel): boolean {
  return ki !== 0 || kp * weights.proportional + feedforwardGain !== 0 || kd * weights.derivative !== 0;
}

/** The poles of all blocks that take part, cancelled or not: the modes of the loop cut open at its dead time. */
export function openLoopPoles(model: LoopModel): Complex[] {
  const blocks = [integralPath(model), derivativePath(model).block, model.filters, model.plant, model.sensor];
  return blocks.filter((block) => block.gain !== 0).flatMap((block) => block.poles);
}

/** Whether the controller with its filters can be realised at all: an unfiltered derivative needs a filter that falls off. */
export function isRealisable({ gains, filters }: LoopModel): boolean {
  return gains.kd === 0 || gains.filterTime > 0 || filters.poles.length > filters.zeros.length;
}

const integralPath = ({ gains }: LoopModel): Rational => rational(gains.ki, [], [0]);

/** Kd·s/(1 + s·Tf) ahead of the filters, or, where Tf = 0, Kd·s·K(s) as one proper function beside them. */
function derivativePath({ gains, filters }: LoopModel): { block: Rational; afterFilters: boolean } {
  const { kd, filterTime } = gains;
  if (filterTime > 0) return { block: rational(kd / filterTime, [0], [-1 / filterTime]), afterFilters: false };
  const block = { gain: kd * filters.gain, zeros: [...filters.zeros, { re: 0, im: 0 }], poles: filters.poles };
  return { block, afterFilters: true };
}

function rational(gain: number, zeros: readonly number[], poles: readonly number[]): Rational {
  const real = (re: number) => ({ re, im: 0 });
  return { gain, zeros: zeros.map(real), poles: poles.map(real) };
}
