import type { Complex } from '@/analysis/numbers/complex';
import type { Rational } from './model';
import { PolynomialFactor } from './polynomial-factor';
import { RootFactors } from './root-factors';
import { argument, IM, LOG_SLOPE, PHASE_SLOPE, RE, startProduct, WIDTH } from './turning-product';

/** coefficient·s^power: what a function tends to at one end of the axis. */
export interface Asymptote {
  readonly coefficient: number;
  readonly power: number;
}

/** A product of rational functions on the imaginary axis. Its value at jω is in the fields after `evaluate(ω)`. */
export class AxisProduct {
  logMagnitude = 0;
  /** Unwrapped, radians, starting at 0 for a positive and −π for a negative gain. */
  phase = 0;
  re = 0;
  im = 0;
  logSlope = 0;
  phaseSlope = 0;
  readonly atZero: Asymptote;
  readonly atInfinity: Asymptote;
  private readonly top: Side;
  private readonly bottom: Side;
  private readonly gain: number;
  private readonly originPower: number;

  constructor(parts: readonly Rational[]) {
    this.top = new Side(parts.map((part) => ({ roots: part.zeros, coefficients: part.coefficients?.numerator })));
    this.bottom = new Side(parts.map((part) => ({ roots: part.poles, coefficients: part.coefficients?.denominator })));
    this.originPower = this.top.atOrigin - this.bottom.atOrigin;
    const free = parts.reduce((gain, part) => (part.coefficients ? gain : gain * part.gain), 1);
    this.gain = free * this.top.sign * this.bottom.sign;
    const leading = parts.reduce((gain, part) => gain * part.gain, 1);
    const order = parts.reduce((sum, part) => sum + part.zeros.length - part.poles.length, 0);
    this.atInfinity = { coefficient: leading, power: order };
    this.atZero = { coefficient: (this.gain * this.top.constant) / this.bottom.constant, power: this.originPower };
  }

  get isZero(): boolean {
    return this.gain === 0;
  }

  /** The phase starts at −π rather than 0. */
  get isNegative(): boolean {
    return this.gain < 0;
  }

  evaluate(omega: number): void {
    const top = this.top.evaluate(omega);
    const bottom = this.bottom.evaluate(omega);
    const square = bottom[RE] * bottom[RE] + bottom[IM] * bottom[IM];
    const re = (top[RE] * bottom[RE] + top[IM] * bottom[IM]) / square;
    const im = (top[IM] * bottom[RE] - top[RE] * bottom[IM]) / square;
    const scale = this.gain * omega ** this.originPower;
    const turn = ((this.originPower % 4) + 4) % 4;
    this.re = scale * (turn === 0 ? re : turn === 1 ? -im : turn === 2 ? -re : im);
    this.im = scale * (turn === 0 ? im : turn === 1 ? re : turn === 2 ? -im : -re);
    this.logMagnitude = Math.log(Math.abs(scale) * Math.sqrt(re * re + im * im));
    this.phase = argument(top) - argument(bottom) + (this.originPower * Math.PI) / 2 - (this.gain < 0 ? Math.PI : 0);
    this.logSlope = top[LOG_SLOPE] - bottom[LOG_SLOPE] + this.originPower;
    this.phaseSlope = top[PHASE_SLOPE] - bottom[PHASE_SLOPE];
  }
}

/** One side of the fraction: every factor of it away from the origin, each with a positive value at s = 0. */
class Side {
  readonly atOrigin: number;
  readonly sign: number;
  /** Value of the factors at s = 0. */
  readonly constant: number;
  private readonly factors: RootFactors;
  private readonly polynomials: readonly PolynomialFactor[];
  private readonly product = new Float64Array(WIDTH);

  constructor(parts: readonly { roots: readonly Complex[]; coefficients?: readonly number[] }[]) {
    const away = parts.map(({ roots, coefficients }) => ({ coefficients, roots: roots.filter((root) => root.re !== 0 || root.im !== 0) }));
    this.atOrigin = parts.reduce((count, { roots }, i) => count + roots.length - away[i].roots.length, 0);
    const free = away.filter((part) => !part.coefficients).flatMap((part) => part.roots);
    const given = away.flatMap(({ roots, coefficients }) => (coefficients ? [{ roots, ...normalised(coefficients) }] : []));
    const negated = free.filter((root) => root.im === 0 && root.re > 0).length;
    this.sign = given.reduce((sign, part) => sign * part.sign, negated % 2 === 0 ? 1 : -1);
    this.constant = [...free.map((root) => Math.hypot(root.re, root.im)), ...given.map((part) => part.ascending[0])].reduce(
      (x, y) => x * y,
      1,
    );
    this.factors = new RootFactors(free);
    this.polynomials = given.map(({ ascending, roots }) => new PolynomialFactor(ascending, roots));
  }

  evaluate(omega: number): Float64Array {
    startProduct(this.product);
    this.factors.multiplyInto(this.product, omega);
    for (const polynomial of this.polynomials) polynomial.multiplyInto(this.product, omega);
    return this.product;
  }
}

/** Ascending, without factors of s, the constant term made positive. */
const normalised = (descending: readonly number[]) => {
  const ascending = [...descending].reverse();
  const first = ascending.findIndex((c) => c !== 0);
  const sign = Math.sign(ascending[first]);
  return { sign, ascending: ascending.slice(first).map((c) => c * sign) };
};
