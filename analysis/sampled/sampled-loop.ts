import { AxisProduct, productOf, type Asymptote } from '@/analysis/loop/axis-product';
import { axisFrequencies, landmarks } from '@/analysis/margins/landmarks';
import type { EndOfAxis, LoopFunction } from '@/analysis/margins/loop-function';
import * as S from '@/analysis/margins/sample';
import { LEAST_LISTED_GAIN, ZERO_GAIN } from '@/analysis/margins/least-gain';
import type { SampledModel } from './sampled-model';
import { outOfRange, tooMuch } from '@/analysis/margins/loop-refusals';

/** More evaluations than any loop needs that a person would draw. */
const MOST_EVALUATIONS = 400_000;

/** L has no value at an undamped pole or zero itself; this near to it, it has. */
const BESIDE = 1 + 2 ** -44;

/**
 * A SampledModel on the unit circle z = e^(jωh), 0 < ω < π/h, by way of v = j·tan(ωh/2): every part is a rational function
 * there, and whole periods of delay turn the phase by ωh each.
 */
export class SampledLoop implements LoopFunction {
  readonly landmarks: readonly number[];
  readonly axisFrequencies: readonly number[];
  readonly isZero: boolean;
  readonly deadTime = 0;
  readonly end: number;
  readonly leastListedGain: number;
  readonly atZero: EndOfAxis;
  readonly atInfinity: EndOfAxis;
  evaluations = 0;
  private readonly seen: AxisProduct;
  private readonly command: AxisProduct;
  private readonly plant: AxisProduct;
  private readonly forward: AxisProduct;
  private readonly period: number;
  private readonly turns: { readonly loop: number; readonly plant: number };
  /** Both plant and controller negative: each starts at −180°, the loop at 0°. */
  private readonly phaseShift: number;

  constructor(model: SampledModel) {
    const { period, delay, loopPlant, plant, controller, filters, forward } = model;
    this.period = period;
    this.end = Math.PI / period;
    this.leastListedGain = delay > 0 ? LEAST_LISTED_GAIN : ZERO_GAIN;
    this.seen = new AxisProduct([loopPlant.rational]);
    this.command = new AxisProduct([controller, filters]);
    this.plant = plant === loopPlant ? this.seen : new AxisProduct([plant.rational]);
    this.forward = new AxisProduct([forward, filters]);
    this.turns = { loop: loopPlant.periods, plant: plant.periods };
    const parts = [loopPlant.rational, controller, filters];
    const toOmega = (v: number) => (2 / period) * Math.atan(v);
    this.landmarks = landmarks(parts, 0).map(toOmega);
    this.axisFrequencies = axisFrequencies(parts).map(toOmega);
    this.isZero = this.seen.isZero || this.command.isZero;
    this.atZero = this.endAtZero();
    this.atInfinity = this.endAtInfinity();
    this.phaseShift = this.seen.isNegative && this.command.isNegative ? 2 * Math.PI : 0;
  }

  sampleAt(omega: number, table: S.Table, offset: number): void {
    this.evaluations += 1;
    if (this.evaluations > MOST_EVALUATIONS) throw tooMuch();
    const { seen, command, plant, forward, turns } = this;
    const angle = this.period * (this.axisFrequencies.includes(omega) ? omega * BESIDE : omega);
    const v = Math.tan(angle / 2);
    /** d ln v/d ln ω. */
    const stretch = angle / Math.sin(angle);
    seen.evaluate(v);
    command.evaluate(v);
    forward.evaluate(v);
    if (plant !== seen) plant.evaluate(v);
    const re = seen.re * command.re - seen.im * command.im;
    const im = seen.re * command.im + seen.im * command.re;
    const turn = turns.loop * angle;
    const cos = Math.cos(turn);
    const sin = -Math.sin(turn);
    table[offset + S.OMEGA] = omega;
    table[offset + S.RE] = re * cos - im * sin;
    table[offset + S.IM] = re * sin + im * cos;
    table[offset + S.MAGNITUDE] = seen.magnitude * command.magnitude;
    table[offset + S.LOG] = seen.logMagnitude + command.logMagnitude;
    table[offset + S.LOG_SLOPE] = stretch * (seen.logSlope + command.logSlope);
    table[offset + S.PHASE] = seen.phase + command.phase + this.phaseShift - turn;
    table[offset + S.PHASE_SLOPE] = stretch * (seen.phaseSlope + command.phaseSlope) - turn;
    table[offset + S.PLANT_MAGNITUDE] = plant.magnitude;
    table[offset + S.PLANT_PHASE] = plant.phase - turns.plant * angle;
    table[offset + S.COMMAND_MAGNITUDE] = command.magnitude;
    table[offset + S.COMMAND_PHASE] = command.phase;
    table[offset + S.COMMAND_LOG] = command.logMagnitude;
    table[offset + S.COMMAND_LOG_SLOPE] = stretch * command.logSlope;
    table[offset + S.REFERENCE_LOG] = plant.logMagnitude + forward.logMagnitude;
    table[offset + S.REFERENCE_LOG_SLOPE] = stretch * (plant.logSlope + forward.logSlope);
    if (Number.isNaN(table[offset + S.RE] + table[offset + S.PHASE])) throw outOfRange(omega);
  }

  /** Near z = 1, v is s·h/2. */
  private endAtZero(): EndOfAxis {
    const inS = ({ coefficient, power }: Asymptote) => ({ coefficient: coefficient * (this.period / 2) ** power, power });
    const { seen, command, plant, forward } = this;
    return {
      loop: inS(productOf(seen.atZero, command.atZero)),
      command: inS(command.atZero),
      reference: inS(productOf(plant.atZero, forward.atZero)),
    };
  }

  /** At z = −1, where every period of delay changes the sign. */
  private endAtInfinity(): EndOfAxis {
    const { seen, command, plant, forward, turns } = this;
    const loop = productOf(seen.atInfinity, command.atInfinity);
    return {
      loop: { ...loop, coefficient: turns.loop % 2 === 0 ? loop.coefficient : -loop.coefficient },
      command: command.atInfinity,
      reference: productOf(plant.atInfinity, forward.atInfinity),
    };
  }
}
