import type { ComplexNumber, PlantModel } from '@/contract';

type WorkedOut = Exclude<PlantModel, { kind: 'formula' }>;

/** Digits that a reader can bear and that lose nothing a computation could use. */
const FIGURES = 15;
export const exactText = (value: number): string => String(Number(value.toPrecision(FIGURES)));

const power = (exponent: number): string => (exponent === 1 ? 's' : `s^${exponent}`);

function polynomial(coefficients: readonly number[]): string {
  const terms = coefficients.flatMap((value, i) => {
    const exponent = coefficients.length - 1 - i;
    if (value === 0) return [];
    const size = exactText(Math.abs(value));
    const term = exponent === 0 ? size : size === '1' ? power(exponent) : `${size} ${power(exponent)}`;
    return [`${value < 0 ? '-' : '+'} ${term}`];
  });
  return terms.join(' ').replace(/^\+ /, '').replace(/^- /, '-');
}

/** The product of factors in s with these roots: powers of s, (s + a), a pair as one quadratic, each with its multiplicity as a power. */
function factors(roots: readonly ComplexNumber[]): string[] {
  const texts = roots
    .filter(({ im }) => im >= 0)
    .map(({ re, im }) => {
      if (im !== 0) return `(${polynomial([1, -2 * re, re * re + im * im])})`;
      return re === 0 ? 's' : `(${polynomial([1, -re])})`;
    });
  return [...new Set(texts)].map((text) => {
    const times = texts.filter((other) => other === text).length;
    return times === 1 ? text : `${text}^${times}`;
  });
}

const product = (parts: readonly string[]): string => parts.join(' ').replaceAll(') (', ')(');
const delay = (deadTime: number): string => (deadTime > 0 ? ` exp(-${exactText(deadTime)} s)` : '');

function fromRoots({ gain, zeros, poles, deadTime }: Extract<WorkedOut, { kind: 'roots' }>): string {
  const over = product([exactText(gain), ...factors(zeros)]) + delay(deadTime);
  const under = factors(poles);
  if (under.length === 0) return over;
  return `${over}/${under.length === 1 ? under[0] : `(${product(under)})`}`;
}

function fromCoefficients({ numerator, denominator, deadTime }: Extract<WorkedOut, { kind: 'coefficients' }>): string {
  const top = polynomial(numerator);
  const over = (numerator.length === 1 ? top : `(${top})`) + delay(deadTime);
  const under = polynomial(denominator);
  return under === '1' ? over : `${over}/(${under})`;
}

/**
 * A plant as an ordinary formula: what is factored stays factored, what is one polynomial over another stays that.
 *
 * @example formulaText({ kind: 'roots', gain: 6, zeros: [], poles: [{ re: 0, im: 0 }, { re: -2, im: 0 }], deadTime: 0.08 })
 * // "6 exp(-0.08 s)/(s (s + 2))"
 */
export const formulaText = (plant: WorkedOut): string => (plant.kind === 'roots' ? fromRoots(plant) : fromCoefficients(plant));
