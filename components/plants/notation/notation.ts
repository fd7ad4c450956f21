import type { PlantModel } from '@/contract';

/** The three ways in which a plant is typed. */
export type Notation = PlantModel['kind'];

export const notations = [
  { value: 'coefficients', label: 'Polynomials' },
  { value: 'roots', label: 'Poles and zeros' },
  { value: 'formula', label: 'Formula' },
] as const satisfies readonly { value: Notation; label: string }[];

/** As a sentence names what stands in it. */
export const notationWords: Readonly<Record<Notation, string>> = {
  coefficients: 'polynomials',
  roots: 'poles and zeros',
  formula: 'formula',
};

/** What is typed in the three notations. */
export interface NotationText {
  numerator: string;
  denominator: string;
  gain: string;
  zeros: string;
  poles: string;
  formula: string;
  /** Values of the formula's parameters by name, also of those that its text has no more. */
  parameters: Record<string, string>;
  /** Of polynomials and of roots. A formula has its own in its text. */
  deadTime: string;
}

const fields = {
  coefficients: ['numerator', 'denominator'],
  roots: ['gain', 'zeros', 'poles'],
  formula: ['formula', 'parameters'],
} as const satisfies Record<Notation, readonly (keyof NotationText)[]>;

/** What stands in one notation, as one text that can be compared. */
export const textIn = (typed: NotationText, notation: Notation): string => JSON.stringify(fields[notation].map((field) => typed[field]));

export const isBlankIn = (typed: NotationText, notation: Notation): boolean =>
  fields[notation].every((field) => field === 'parameters' || typed[field].trim() === '');

/** The fields of one notation, its dead time among them. */
export function fieldsIn(typed: NotationText, notation: Notation): Partial<NotationText> {
  const names: readonly (keyof NotationText)[] = notation === 'formula' ? fields.formula : [...fields[notation], 'deadTime'];
  return Object.fromEntries(names.map((field) => [field, typed[field]]));
}
