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
  coefficients: 'the polynomials',
  roots: 'the poles and zeros',
  formula: 'the formula',
};
