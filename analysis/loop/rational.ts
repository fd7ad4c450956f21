import type { Complex } from '@/analysis/numbers/complex';
import { withoutLeadingZeros } from '@/analysis/numbers/polynomial';
import { polynomialRoots } from '@/analysis/numbers/polynomial-roots';
import type { Rational } from './model';

export const UNITY: Rational = { gain: 1, zeros: [], poles: [] };

/** The constant `gain`. */
export const constant = (gain: number): Rational => ({ gain, zeros: [], poles: [] });

/**
 * A rational function from descending coefficients, which stay with it and are what is evaluated.
 * An all-zero numerator gives the zero function. The denominator is not zero.
 */
export const fromCoefficients = (numerator: readonly number[], denominator: readonly number[]): Rational => {
  const top = withoutLeadingZeros(numerator);
  const bottom = withoutLeadingZeros(denominator);
  if (top.length === 0) return constant(0);
  return {
    gain: top[0] / bottom[0],
    zeros: polynomialRoots(top),
    poles: polynomialRoots(bottom),
    coefficients: { numerator: top, denominator: bottom },
  };
};

/** A real root at −1/time, or none where the time is 0: the factor (1 + s·time). */
export const rootOfTime = (time: number): Complex[] => (time === 0 ? [] : [{ re: -1 / time, im: 0 }]);

/** Static gain of factors (1 + s·time): what multiplies Π(s − root) so that the factors are 1 at s = 0. */
export const timeFactor = (time: number): number => (time === 0 ? 1 : time);

/** Product of factored functions; no factor is ever expanded. */
export const product = (parts: readonly Rational[]): Rational => ({
  gain: parts.reduce((gain, part) => gain * part.gain, 1),
  zeros: parts.flatMap((part) => part.zeros),
  poles: parts.flatMap((part) => part.poles),
});
