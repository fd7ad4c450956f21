import { AxisProduct, productOf } from '@/analysis/loop/axis-product';
import { fromGains } from '@/analysis/loop/controller';
import type { LoopModel, Rational } from '@/analysis/loop/model';
import { axisFrequencies, landmarks } from './landmarks';
import { LEAST_LISTED_GAIN, ZERO_GAIN } from './least-gain';
import type { EndOfAxis, LoopFunction } from './loop-function';
import * as S from './sample';
import { outOfRange, tooMuch } from './loop-refusals';

/** More evaluations than any loop needs that a person would draw; past it the loop is refused rather than waited for. */
export const MOST_EVALUATIONS = 400_000;

/** L has no value at an undamped pole or zero itself; this near to it, it has. */
const BESIDE = 1 + 2 ** -44;

/** A continuous LoopModel on the axis s = jω, dead time exact. */
export class ContinuousLoop implements LoopFunction {
  readonly landmarks: readonly number[];
  readonly axisFrequencies: readonly number[];
  readonly isZero: boolean;
  readonly deadTime: number;
  readonly end = null;
  readonly leastListedGain: number;
  readonly atZero: EndOfAxis;
  readonly atInfinity: EndOfAxis;
  evaluations = 0;
  private readonly plant: AxisProduct;
  private readonly command: AxisProduct;
  private readonly sensor: AxisProduct;
  private readonly forward: AxisProduct;
  private readonly plantDeadTime: number;
  /** Both plant and controller negative: each starts at −180°, the loop at 0°. */
  private readonly phaseShift: number;

  constructor(model: LoopModel) {
    const { plant, controller, filters, sensor } = model;
    const forward = forwardController(model);
    this.plant = new AxisProduct([plant]);
    this.command = new AxisProduct([controller, filters]);
    this.sensor = new AxisProduct([sensor]);
    this.forward = forward === controller ? this.command : new AxisProduct([forward, filters]);
    this.plantDeadTime = model.plantDeadTime;
    this.deadTime = model.plantDeadTime + model.sensorDeadTime;
    this.leastListedGain = this.deadTime > 0 ? LEAST_LISTED_GAIN : ZERO_GAIN;
    const parts = [plant, controller, filters, sensor];
    this.landmarks = landmarks(parts, this.deadTime);
    this.axisFrequencies = axisFrequencies(parts);
    this.isZero = this.plant.isZero || this.command.isZero;
    this.atZero = this.endOfAxis('atZero');
    this.atInfinity = this.endOfAxis('atInfinity');
    this.phaseShift = this.plant.isNegative && this.command.isNegative ? 2 * Math.PI : 0;
  }

  sampleAt(omega: number, table: S.Table, offset: number): void {
    this.evaluations += 1;
    if (this.evaluations > MOST_EVALUATIONS) throw tooMuch();
    const { plant, command, sensor, forward, deadTime } = this;
    const beside = this.axisFrequencies.includes(omega) ? omega * BESIDE : omega;
    plant.evaluate(beside);
    command.evaluate(beside);
    sensor.evaluate(beside);
    if (forward !== command) forward.evaluate(beside);
    const re = plant.re * command.re - plant.im * command.im;
    const im = plant.re * command.im + plant.im * command.re;
    const loopRe = re * sensor.re - im * sensor.im;
    const loopIm = re * sensor.im + im * sensor.re;
    const turn = omega * deadTime;
    const cos = deadTime === 0 ? 1 : Math.cos(turn);
    const sin = deadTime === 0 ? 0 : -Math.sin(turn);
    table[offset + S.OMEGA] = omega;
    table[offset + S.RE] = loopRe * cos - loopIm * sin;
    table[offset + S.IM] = loopRe * sin + loopIm * cos;
    table[offset + S.MAGNITUDE] = plant.magnitude * command.magnitude * sensor.magnitude;
    table[offset + S.LOG] = plant.logMagnitude + command.logMagnitude + sensor.logMagnitude;
    table[offset + S.LOG_SLOPE] = plant.logSlope + command.logSlope + sensor.logSlope;
    table[offset + S.PHASE] = plant.phase + command.phase + sensor.phase + this.phaseShift - turn;
    table[offset + S.PHASE_SLOPE] = plant.phaseSlope + command.phaseSlope + sensor.phaseSlope - turn;
    table[offset + S.PLANT_MAGNITUDE] = plant.magnitude;
    table[offset + S.PLANT_PHASE] = plant.phase - omega * this.plantDeadTime;
    table[offset + S.COMMAND_MAGNITUDE] = command.magnitude;
    table[offset + S.COMMAND_PHASE] = command.phase;
    table[offset + S.COMMAND_LOG] = command.logMagnitude;
    table[offset + S.COMMAND_LOG_SLOPE] = command.logSlope;
    table[offset + S.REFERENCE_LOG] = plant.logMagnitude + forward.logMagnitude;
    table[offset + S.REFERENCE_LOG_SLOPE] = plant.logSlope + forward.logSlope;
    if (Number.isNaN(table[offset + S.RE] + table[offset + S.PHASE])) throw outOfRange(omega);
  }

  private endOfAxis(end: 'atZero' | 'atInfinity'): EndOfAxis {
    const { plant, command, sensor, forward } = this;
    return {
      loop: productOf(productOf(plant[end], command[end]), sensor[end]),
      command: command[end],
      reference: productOf(plant[end], forward[end]),
    };
  }
}

/** C_r + F: the controller with its set-point weights, and the static feedforward beside it. */
const forwardController = ({ gains, weights, feedforwardGain, controller }: LoopModel): Rational => {
  if (weights.proportional === 1 && weights.derivative === 1 && feedforwardGain === 0) return controller;
  return fromGains({ ...gains, kp: gains.kp * weights.proportional + feedforwardGain, kd: gains.kd * weights.derivative });
};
