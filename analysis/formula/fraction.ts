import { add, multiply, withoutLeadingZeros } from '@/analysis/numbers/polynomial';

/** A polynomial in s, descending, leading coefficient not zero. */
export type Polynomial = readonly number[];

/**
 * gain·Π top/Π bottom·e^(−s·deadTime), while a formula is being worked out. Products stay lists of factors; only a sum is
 * ever expanded. Constants are in the gain; a factor is at least linear.
 */
export interface Fraction {
  readonly gain: number;
  readonly top: readonly Polynomial[];
  readonly bottom: readonly Polynomial[];
  readonly deadTime: number;
}

export const number = (gain: number): Fraction => ({ gain, top: [], bottom: [], deadTime: 0 });

export const VARIABLE: Fraction = { gain: 1, top: [[1, 0]], bottom: [], deadTime: 0 };

export const isNumber = ({ top, bottom, deadTime }: Fraction): boolean => top.length === 0 && bottom.length === 0 && deadTime === 0;

export const times = (a: Fraction, b: Fraction): Fraction => ({
  gain: a.gain * b.gain,
  top: [...a.top, ...b.top],
  bottom: [...a.bottom, ...b.bottom],
  deadTime: a.deadTime + b.deadTime,
});

/** 1/a; a is not zero. */
export const inverse = (a: Fraction): Fraction => ({ gain: 1 / a.gain, top: a.bottom, bottom: a.top, deadTime: -a.deadTime });

/** a to an integer power. */
export const power = (a: Fraction, exponent: number): Fraction => {
  const base = exponent < 0 ? inverse(a) : a;
  return Array.from({ length: Math.abs(exponent) }).reduce<Fraction>((product) => times(product, base), number(1));
};

/** a + b over their common denominator; null where their dead times differ, which no single dead time can stand for. */
export const plus = (a: Fraction, b: Fraction): Fraction | null => {
  if (a.gain === 0) return b;
  if (b.gain === 0) return a;
  if (a.deadTime !== b.deadTime) return null;
  const { shared, onlyA, onlyB } = common(a.bottom, b.bottom);
  const sum = withoutLeadingZeros(add(expand(a.gain, [...a.top, ...onlyB]), expand(b.gain, [...b.top, ...onlyA])));
  if (sum.length === 0) return number(0);
  const bottom = [...shared, ...onlyA, ...onlyB];
  return sum.length === 1 ? { gain: sum[0], top: [], bottom, deadTime: a.deadTime } : { gain: 1, top: [sum], bottom, deadTime: a.deadTime };
};

/** Total degree of a list of factors. */
export const degree = (factors: readonly Polynomial[]): number => factors.reduce((sum, factor) => sum + factor.length - 1, 0);

const expand = (gain: number, factors: readonly Polynomial[]): number[] =>
  factors.reduce<number[]>((product, factor) => multiply(product, factor), [gain]);

/** Factors that two denominators share, once each, and what is left of either. */
const common = (a: readonly Polynomial[], b: readonly Polynomial[]) => {
  const onlyB = [...b];
  const shared: Polynomial[] = [];
  const onlyA = a.filter((factor) => {
    const match = onlyB.findIndex((other) => other.length === factor.length && other.every((c, i) => c === factor[i]));
    if (match >= 0) shared.push(...onlyB.splice(match, 1));
    return match < 0;
  });
  return { shared, onlyA, onlyB };
};
