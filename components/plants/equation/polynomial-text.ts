import { typographicMinus } from '@/figures/format';

export const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const FIGURES = 6;

/** A coefficient as it is printed: six significant figures, no idle zeros, a true minus. */
export const coefficientText = (value: number): string => typographicMinus(String(Number(value.toPrecision(FIGURES))).replace('e+', 'e'));

/** A whole number as a raised figure. */
export const superscript = (exponent: number): string => [...String(exponent)].map((digit) => superscripts[Number(digit)]).join('');

const power = (exponent: number): string => {
  if (exponent === 0) return '';
  return exponent === 1 ? 's' : `s${superscript(exponent)}`;
};

/**
 * A polynomial in descending powers of s, as it is read.
 *
 * @example polynomialText([0.35, 1, 0]) // "0.35 s² + s"
 */
export function polynomialText(coefficients: readonly number[]): string {
  const terms = coefficients
    .map((value, i) => ({ value, exponent: coefficients.length - 1 - i }))
    .filter(({ value }) => value !== 0)
    .map(({ value, exponent }, i) => {
      const size = Math.abs(value);
      const number = size === 1 && exponent > 0 ? '' : coefficientText(size);
      const term = [number, power(exponent)].filter(Boolean).join(' ');
      if (i === 0) return value < 0 ? `−${term}` : term;
      return `${value < 0 ? '−' : '+'} ${term}`;
    });
  return terms.join(' ') || '0';
}
