import type { Complex } from '@/analysis/numbers/complex';
import type { Rational } from './model';
import { PolynomialFactor } from './polynomial-factor';
import { RootFactors } from './root-factors';
import { argument, divideBy, IM, LOG_SLOPE, PHASE_SLOPE, RE, startProduct, WIDTH } from './turning-product';

/** coefficient·s^power: what a function tends to at one end of the axis. */
export interface Asymptote {
  readonly coefficient: number;
  readonly power: number;
}

/** What the product of two functions tends to at an end where each tends to this. */
export const productOf = (a: Asymptote, b: Asymptote): Asymptote => ({
  coefficient: a.coefficient * b.coefficient,
  power: a.power + b.power,
});

/** A product of rational functions on the imaginary axis. Its value at jω is in the fields after `evaluate(ω)`. */
export class AxisProduct {
  magnitude = 1;
  logMagnitude = 0;
  /** Unwrapped, radians, starting at 0 for a positive and −π for a negative gain. */
  phase = 0;
  re = 1;
  im = 0;
  logSlope = 0;
  phaseSlope = 0;
  readonly atZero: Asymptote;
  readonly atInfinity: Asymptote;
  private readonly top: Side;
  private readonly bottom: Side;
  private readonly gain: number;
  private readonly originPower: number;
  /** Nothing but a gain, which the fields hold from the start. */
  private readonly isConstant: boolean;

  constructor(parts: readonly Rational[]) {
    this.top = new Side(parts.map((part) => ({ roots: part.zeros, coefficients: part.coefficients?.numerator })));
    this.bottom = new Side(parts.map((part) => ({ roots: part.poles, coefficients: part.coefficients?.denominator })));
    this.originPower = this.top.atOrigin - this.bottom.atOrigin;
    const free = parts.reduce((gain, part) => (part.coefficients ? gain : gain * part.gain), 1);
    this.gain = (free * this.top.scale) / this.bottom.scale;
    const leading = parts.reduce((gain, part) => gain * part.gain, 1);
    const order = parts.reduce((sum, part) => sum + part.zeros.length - part.poles.length, 0);
    this.atInfinity = { coefficient: leading, power: order };
    this.atZero = { coefficient: (this.gain * this.top.constant) / this.bottom.constant, power: this.originPower };
    this.isConstant = this.top.isUnity && this.bottom.isUnity;
    this.setConstant();
  }

  get isZero(): boolean {
    return this.gain === 0;
  }

  /** The phase starts at −π rather than 0. */
  get isNegative(): boolean {
    return this.gain < 0;
  }

  private setConstant(): void {
    this.re = this.gain;
    this.magnitude = Math.abs(this.gain);
    this.logMagnitude = Math.log(this.magnitude);
    this.phase = this.gain < 0 ? -Math.PI : 0;
  }

  evaluate(omega: number): void {
    if (this.isConstant) return;
    const { gain, originPower } = this;
    const quotient = this.top.evaluate(omega);
    divideBy(quotient, this.bottom.evaluate(omega));
    const re = quotient[RE];
    const im = quotient[IM];
    const scale = gain * power(omega, originPower);
    const turn = originPower & 3;
    this.re = scale * (turn === 0 ? re : turn === 1 ? -im : turn === 2 ? -re : im);
    this.im = scale * (turn === 0 ? im : turn === 1 ? re : turn === 2 ? -im : -re);
    this.magnitude = Math.abs(scale) * Math.sqrt(re * re + im * im);
    this.logMagnitude = Math.log(this.magnitude);
    this.phase = argument(quotient) + (originPower * Math.PI) / 2 - (gain < 0 ? Math.PI : 0);
    this.logSlope = quotient[LOG_SLOPE] + originPower;
    this.phaseSlope = quotient[PHASE_SLOPE];
  }
}

/** x to a small whole power. */
const power = (x: number, exponent: number): number => {
  let value = 1;
  for (let k = Math.abs(exponent); k > 0; k -= 1) value *= x;
  return exponent < 0 ? 1 / value : value;
};

/** One side of the fraction: every factor of it away from the origin, each with a positive value at s = 0. */
class Side {
  readonly atOrigin: number;
  /** What stands before the factors: −1 for each negated one, and what is constant. */
  readonly scale: number;
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
    const bending = given.filter(({ ascending }) => ascending.length > 1);
    const negated = free.filter((root) => root.im === 0 && root.re > 0).length;
    this.scale = given.reduce(
      (scale, { sign, ascending }) => scale * sign * (ascending.length > 1 ? 1 : ascending[0]),
      negated % 2 === 0 ? 1 : -1,
    );
    const sizes = free.map((root) => Math.hypot(root.re, root.im));
    this.constant = [...sizes, ...bending.map(({ ascending }) => ascending[0])].reduce((x, y) => x * y, 1);
    this.factors = new RootFactors(free);
    this.polynomials = bending.map(({ ascending, roots }) => new PolynomialFactor(ascending, roots));
  }

  /** No factor at all. */
  get isUnity(): boolean {
    return this.factors.isEmpty && this.polynomials.length === 0 && this.atOrigin === 0;
  }

  evaluate(omega: number): Float64Array {
    startProduct(this.product);
    this.factors.multiplyInto(this.product, omega);
    this.factors.addSlopes(this.product, omega);
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
