import { describePlant, LoopError } from '@/analysis';
import { parseNumber } from '@/components/ui/parse-number';
import type { PlantModel } from '@/contract';
import { formulaNames } from './formula-names';
import type { Notation, NotationText } from './notation';
import { parseCoefficients } from './parse-coefficients';
import { parseRoots } from './parse-roots';
import { readTime } from './read-time';

const MOST_COEFFICIENTS = 25;
const MOST_ROOTS = 24;
const LONGEST_FORMULA = 500;

/** What is wrong, by the name of the field; a formula's parameter is "parameters.k". */
export type FieldErrors = Record<string, string>;

export interface ReadNotation {
  /** Null where a field cannot be read. A formula is only as well written as a page without a parser can tell. */
  plant: PlantModel | null;
  errors: FieldErrors;
}

const readPolynomial = (text: string, name: string): number[] | string => {
  if (text.trim() === '') return `${name} has at least one coefficient.`;
  const read = parseCoefficients(text);
  if ('wrong' in read) return read.wrong === '' ? 'A coefficient is missing.' : `“${read.wrong}” is not a number.`;
  if (read.numbers.length > MOST_COEFFICIENTS) return `${name} has at most ${MOST_COEFFICIENTS} coefficients.`;
  return read.numbers.every((c) => c === 0) ? `${name} is not zero.` : read.numbers;
};

const readRoots = (text: string, name: string) => {
  const read = parseRoots(text);
  if ('problem' in read) return read.problem;
  return read.roots.length > MOST_ROOTS ? `At most ${MOST_ROOTS} ${name}.` : read.roots;
};

const readGain = (text: string): number | string => {
  const gain = parseNumber(text);
  if (gain === null) return 'The gain is a number, as in 6.';
  return gain === 0 ? 'The gain is not zero.' : gain;
};

/** Collects what is wrong at each field, and hands on what is right. */
class Findings {
  readonly errors: FieldErrors = {};

  /** A text is what is wrong; anything else is the value. */
  take<Value extends object | number>(field: string, read: Value | string): Value | null {
    if (typeof read !== 'string') return read;
    this.errors[field] = read;
    return null;
  }
}

function polynomials(typed: NotationText, found: Findings): PlantModel | null {
  const numerator = found.take('numerator', readPolynomial(typed.numerator, 'The numerator'));
  const denominator = found.take('denominator', readPolynomial(typed.denominator, 'The denominator'));
  const deadTime = found.take('deadTime', readTime(typed.deadTime, 'Dead time'));
  return numerator && denominator && deadTime !== null ? { kind: 'coefficients', numerator, denominator, deadTime } : null;
}

function roots(typed: NotationText, found: Findings): PlantModel | null {
  const gain = found.take('gain', readGain(typed.gain));
  const zeros = found.take('zeros', readRoots(typed.zeros, 'zeros'));
  const poles = found.take('poles', readRoots(typed.poles, 'poles'));
  const deadTime = found.take('deadTime', readTime(typed.deadTime, 'Dead time'));
  return gain !== null && zeros && poles && deadTime !== null ? { kind: 'roots', gain, zeros, poles, deadTime } : null;
}

function formula({ formula: typed, parameters }: NotationText, found: Findings): PlantModel | null {
  const text = typed.trim();
  if (text === '') found.errors.formula = 'A formula in s, as in 2 exp(-0.1 s)/(s (s + 3)).';
  if (text.length > LONGEST_FORMULA)
    found.errors.formula = `A formula has at most ${LONGEST_FORMULA} characters. This one has ${text.length}.`;
  const values = formulaNames(text).map((name) => {
    const value = parseNumber(parameters[name] ?? '');
    return [name, found.take(`parameters.${name}`, value ?? `${name} is a number, as in 1500.`)] as const;
  });
  if (Object.keys(found.errors).length > 0) return null;
  return { kind: 'formula', text, parameters: Object.fromEntries(values.map(([name, value]) => [name, value ?? 0])) };
}

const readers = { coefficients: polynomials, roots, formula };
const lastField = { coefficients: 'denominator', roots: 'poles', formula: 'formula' };

const pointed = (pointer: string, notation: Notation): string => /^\/plant\/(\w+)/.exec(pointer)?.[1] ?? lastField[notation];

/** Reads what is typed in one notation: the plant, and at each field that does not make one what is wrong with it. */
export function readNotation(typed: NotationText, notation: Notation): ReadNotation {
  const found = new Findings();
  const plant = readers[notation](typed, found);
  if (plant === null || plant.kind === 'formula') return { plant, errors: found.errors };
  try {
    describePlant(plant);
    return { plant, errors: {} };
  } catch (error) {
    if (error instanceof LoopError) return { plant: null, errors: { [pointed(error.pointer, notation)]: error.detail } };
    throw error;
  }
}
