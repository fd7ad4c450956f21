import { LoopError } from '@/analysis/loop/loop-error';
import type { Rational } from '@/analysis/loop/model';
import { polynomialRoots } from '@/analysis/numbers/polynomial-roots';
import { FormulaReader } from './formula-reader';
import { parseFormula } from './formula-node';
import { degree, type Fraction } from './fraction';
import { refusal } from './refusal';

/** A formula worked out. Where it was written as one polynomial over another, the coefficients stay with it. */
export interface ReadFormula {
  readonly rational: Rational;
  readonly deadTime: number;
}

const LONGEST_DEAD_TIME = 1e4;

/**
 * Reads a transfer function written as ordinary mathematics in s, times one dead time. Products may be implied. A product
 * of factors stays factored.
 *
 * @param parameters values of the other letters
 * @throws LoopError at /plant/text, with the character and the reason
 * @example readFormula('2.1 exp(-0.08 s)/(s (0.35 s + 1))', {}) // gain 6, poles 0 and −2.857…, dead time 0.08
 */
export const readFormula = (text: string, parameters: Readonly<Record<string, number>>): ReadFormula => {
  if (Object.hasOwn(parameters, 's'))
    throw new LoopError({ pointer: '/plant/parameters/s', detail: 's is the variable; a parameter needs another name.', code: 'formula' });
  const fraction = new FormulaReader(text, parameters).read(parseFormula(text));
  if (fraction.gain === 0) throw refusal('The plant is zero: nothing the controller does reaches the output.', 0);
  if (fraction.deadTime < 0)
    throw refusal('exp of a positive multiple of s would answer before it is asked.', Math.max(text.indexOf('exp'), 0));
  if (fraction.deadTime > LONGEST_DEAD_TIME) throw refusal('Dead time is at most 10,000 s.', Math.max(text.indexOf('exp'), 0));
  if (degree(fraction.top) > degree(fraction.bottom))
    throw refusal('The numerator has a higher power of s than the denominator: no real plant differentiates its input.', 0);
  return { rational: rationalOf(fraction), deadTime: fraction.deadTime };
};

const rationalOf = ({ gain, top, bottom }: Fraction): Rational => {
  const leading = (factors: Fraction['top']) => factors.reduce((product, factor) => product * factor[0], 1);
  const isPlain = top.length <= 1 && bottom.length <= 1;
  const numerator = (top[0] ?? [1]).map((c) => c * gain);
  return {
    gain: (gain * leading(top)) / leading(bottom),
    zeros: top.flatMap(polynomialRoots),
    poles: bottom.flatMap(polynomialRoots),
    ...(isPlain ? { coefficients: { numerator, denominator: bottom[0] ?? [1] } } : {}),
  };
};
