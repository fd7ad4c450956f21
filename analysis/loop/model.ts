import type { Loop } from '@/contract';
import type { Complex } from '@/analysis/numbers/complex';

/** Coefficients in descending powers of s. */
export interface Coefficients {
  readonly numerator: readonly number[];
  readonly denominator: readonly number[];
}

/**
 * A real rational function in factored form: gain·Π(s − zeroᵢ)/Π(s − poleᵢ).
 * `gain` is the ratio of the leading coefficients. Conjugates are present and stand next to each other.
 */
export interface Rational {
  readonly gain: number;
  readonly zeros: readonly Complex[];
  readonly poles: readonly Complex[];
  /**
   * Present where coefficients are what was given. They are then evaluated (Horner is exact to rounding even where roots
   * are nearly multiple) and the roots only tell how many turns the phase has made.
   */
  readonly coefficients?: Coefficients;
}

/** PID gains in parallel form: kp + ki/s + kd·s/(1 + s·filterTime). */
export interface ParallelGains {
  readonly kp: number;
  readonly ki: number;
  readonly kd: number;
  readonly filterTime: number;
}

/** How a computer runs the controller; its filters as they were asked for, for each has a digital equivalent of its own, and what holds its command back. */
export interface SampledRun {
  readonly sampling: NonNullable<Loop['sampling']>;
  readonly filters: Loop['controller']['filters'];
  readonly actuator: Loop['actuator'];
}

/**
 * One loop, ready to be evaluated: what plant, controller and sensor of a contract Loop become.
 *
 * In continuous time L(s) = plant·filters·controller·sensor·e^(−s(plantDeadTime + sensorDeadTime)), negative feedback.
 */
export interface LoopModel {
  readonly plant: Rational;
  readonly plantDeadTime: number;
  readonly sensor: Rational;
  readonly sensorDeadTime: number;
  /** The feedback controller C_y as one rational function (filters not included). */
  readonly controller: Rational;
  /** The same controller as converted parallel gains. */
  readonly gains: ParallelGains;
  /** Everything in series behind the controller's output, feedforward included. */
  readonly filters: Rational;
  readonly weights: { readonly proportional: number; readonly derivative: number };
  readonly feedforwardGain: number;
  /** null: in continuous time. */
  readonly sampled: SampledRun | null;
}
