import { magnitude, type Complex } from '@/analysis/numbers/complex';
import { hornerRoom, hornerWithSlope, SIZE, SLOPE_IM, SLOPE_RE, VALUE_IM, VALUE_RE } from '@/analysis/numbers/horner';
import type { Rational } from './model';

const ROUNDING = 2 ** -53;

/**
 * A product of rational functions anywhere in the s plane, factors never expanded.
 * After `evaluate(s)`: its value, the logarithmic derivatives of numerator and denominator, and how many roundings the
 * value may be off by, relatively.
 */
export class PlaneProduct {
  re = 0;
  im = 0;
  readonly top: SideInPlane;
  readonly bottom: SideInPlane;
  private readonly gain: number;

  constructor(parts: readonly Rational[]) {
    this.top = new SideInPlane(parts.map((part) => ({ roots: part.zeros, coefficients: part.coefficients?.numerator })));
    this.bottom = new SideInPlane(parts.map((part) => ({ roots: part.poles, coefficients: part.coefficients?.denominator })));
    this.gain = parts.reduce((gain, part) => (part.coefficients ? gain : gain * part.gain), 1);
  }

  evaluate(re: number, im: number): void {
    const { top, bottom } = this;
    top.evaluate(re, im);
    bottom.evaluate(re, im);
    const scale = this.gain * 2 ** (top.exponent - bottom.exponent);
    const square = bottom.re * bottom.re + bottom.im * bottom.im;
    this.re = (scale * (top.re * bottom.re + top.im * bottom.im)) / square;
    this.im = (scale * (top.im * bottom.re - top.re * bottom.im)) / square;
  }

  /** Relative error that rounding may have left in the value. */
  get uncertainty(): number {
    return ROUNDING * (this.top.roundings + this.bottom.roundings);
  }
}

/** Numerator or denominator: the product (re + j·im)·2^exponent and its logarithmic derivative. */
class SideInPlane {
  re = 1;
  im = 0;
  exponent = 0;
  slopeRe = 0;
  slopeIm = 0;
  roundings = 0;
  private readonly roots: readonly Complex[];
  private readonly polynomials: readonly (readonly number[])[];
  private readonly room = hornerRoom();

  constructor(parts: readonly { roots: readonly Complex[]; coefficients?: readonly number[] }[]) {
    this.roots = parts.filter((part) => !part.coefficients).flatMap((part) => part.roots);
    this.polynomials = parts.flatMap((part) => (part.coefficients ? [part.coefficients] : []));
  }

  get isZero(): boolean {
    return this.re === 0 && this.im === 0;
  }

  evaluate(re: number, im: number): void {
    this.re = 1;
    this.im = this.exponent = this.slopeRe = this.slopeIm = 0;
    this.roundings = 4 * this.roots.length;
    for (const root of this.roots) this.multiply(re - root.re, im - root.im, 1, 0);
    for (const polynomial of this.polynomials) this.multiplyPolynomial(polynomial, re, im);
  }

  private multiplyPolynomial(descending: readonly number[], re: number, im: number): void {
    const { room } = this;
    hornerWithSlope(descending, re, im, room);
    this.roundings += (2 * descending.length * room[SIZE]) / magnitude(room[VALUE_RE], room[VALUE_IM]);
    this.multiply(room[VALUE_RE], room[VALUE_IM], room[SLOPE_RE], room[SLOPE_IM]);
  }

  /** Multiplies in a factor with its derivative, and takes powers of two out before they overflow. */
  private multiply(re: number, im: number, slopeRe: number, slopeIm: number): void {
    const square = re * re + im * im;
    this.slopeRe += (slopeRe * re + slopeIm * im) / square;
    this.slopeIm += (slopeIm * re - slopeRe * im) / square;
    const x = this.re * re - this.im * im;
    const y = this.re * im + this.im * re;
    const shift = Math.max(Math.abs(x), Math.abs(y)) > 1e100 ? -300 : Math.max(Math.abs(x), Math.abs(y)) < 1e-100 ? 300 : 0;
    this.re = x * 2 ** shift;
    this.im = y * 2 ** shift;
    this.exponent -= shift;
  }
}
