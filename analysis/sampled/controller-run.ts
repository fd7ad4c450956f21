import type { ActuatorLimits } from './actuator-limits';
import type { DifferenceEquation } from './difference-equation';
import { FilterRun } from './filter-run';

/** A difference equation in the middle of its run: the memory that a control unit keeps between samples. */
export class ControllerRun {
  /** Whether the last command was held back by the actuator. */
  isLimited = false;
  private integral = 0;
  private derivative = 0;
  private lastError = 0;
  private lastDifference = 0;
  private lastCommand = 0;
  private readonly filters: readonly FilterRun[];

  constructor(
    private readonly equation: DifferenceEquation,
    private readonly limits: ActuatorLimits | null = null,
  ) {
    this.filters = equation.filters.map((filter) => new FilterRun(filter));
  }

  /** The command before the limits that this reference and sample would give; nothing is remembered. */
  preview(reference: number, sample: number): number {
    return this.filters.reduce((value, filter) => filter.preview(value), this.unfiltered(reference, sample));
  }

  /** One sample period: the command for this reference and sample, within the limits. */
  step(reference: number, sample: number): number {
    const [error, difference] = [reference - sample, this.differenceOf(reference, sample)];
    const asked = this.filters.reduce((value, filter) => filter.step(value), this.unfiltered(reference, sample));
    const command = this.withinLimits(asked);
    this.isLimited = command !== asked;
    this.integral = this.keptIntegral(error, asked - command);
    this.derivative = this.nextDerivative(difference);
    this.lastError = error;
    this.lastDifference = difference;
    this.lastCommand = command;
    return command;
  }

  withinLimits(command: number): number {
    if (!this.limits) return command;
    const { low, high, stride } = this.limits;
    const reached = Math.min(Math.max(command, this.lastCommand - stride), this.lastCommand + stride);
    return Math.min(Math.max(reached, low), high);
  }

  /** The integral that the next sample finds; `excess` is what the limits took off the command. */
  private keptIntegral(error: number, excess: number): number {
    const next = this.nextIntegral(error);
    if (!this.limits || !this.equation.integral || excess === 0) return next;
    const { antiWindup, tracking } = this.limits;
    if (antiWindup === 'backCalculation') return next - tracking * excess;
    const drivesDeeper = (next - this.integral) * excess > 0;
    return antiWindup === 'conditional' && drivesDeeper ? this.integral : next;
  }

  private unfiltered(reference: number, sample: number): number {
    const { proportional, proportionalWeight, feedforward } = this.equation;
    return (
      proportional * (proportionalWeight * reference - sample) +
      feedforward * reference +
      this.nextIntegral(reference - sample) +
      this.nextDerivative(this.differenceOf(reference, sample))
    );
  }

  private nextIntegral(error: number): number {
    const { integral } = this.equation;
    return integral ? this.integral + integral.now * error + integral.before * this.lastError : 0;
  }

  private nextDerivative(difference: number): number {
    const { derivative } = this.equation;
    return derivative ? derivative.decay * this.derivative + derivative.gain * (difference - this.lastDifference) : 0;
  }

  private differenceOf(reference: number, sample: number): number {
    return this.equation.derivativeWeight * reference - sample;
  }
}
