import type { DifferenceEquation } from './difference-equation';
import type { DigitalFilter } from './digital-filter';

/** A difference equation in the middle of its run: the memory that a control unit keeps between samples. */
export class ControllerRun {
  private integral = 0;
  private derivative = 0;
  private lastError = 0;
  private lastDifference = 0;
  private readonly filters: readonly FilterRun[];

  constructor(private readonly equation: DifferenceEquation) {
    this.filters = equation.filters.map((filter) => new FilterRun(filter));
  }

  /** The command that this reference and sample would give; nothing is remembered. */
  preview(reference: number, sample: number): number {
    return this.filters.reduce((value, filter) => filter.preview(value), this.unfiltered(reference, sample));
  }

  /** One sample period: the command for this reference and sample. */
  step(reference: number, sample: number): number {
    const unfiltered = this.unfiltered(reference, sample);
    const command = this.filters.reduce((value, filter) => filter.step(value), unfiltered);
    this.integral = this.nextIntegral(reference - sample);
    this.derivative = this.nextDerivative(this.differenceOf(reference, sample));
    this.lastError = reference - sample;
    this.lastDifference = this.differenceOf(reference, sample);
    return command;
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

/** One filter and the samples that it remembers, the latest first. */
class FilterRun {
  private readonly inputs: number[];
  private readonly answers: number[];

  constructor(private readonly filter: DigitalFilter) {
    this.inputs = filter.back.map(() => 0);
    this.answers = filter.back.map(() => 0);
  }

  preview(input: number): number {
    const { forward, back } = this.filter;
    let answer = forward[0] * input;
    for (let i = 0; i < back.length; i += 1) answer += forward[i + 1] * this.inputs[i] - back[i] * this.answers[i];
    return answer;
  }

  step(input: number): number {
    const answer = this.preview(input);
    for (const [memory, latest] of [
      [this.inputs, input],
      [this.answers, answer],
    ] as const) {
      memory.pop();
      memory.unshift(latest);
    }
    return answer;
  }
}
