import type { Analysis, Quantity } from '@/contract';
import { formatFrequency, withUnit } from '@/figures/format';
import { quantityName, quantityText, type ReaderUnits } from '@/figures/quantity-text';

/** One number of the strip: what it is, its value in words, and where it was found. */
export interface MarginNumber {
  readonly quantity: Quantity;
  readonly name: string;
  readonly value: string;
  readonly place: string;
}

interface Reading {
  readonly value: number | null;
  readonly frequency: number | null;
}

const readings: readonly (readonly [Quantity, (analysis: Analysis) => Reading])[] = [
  ['ms', ({ sensitivity: { ms } }) => ms],
  ['phaseMargin', ({ margins: { phase } }) => ({ value: phase?.degrees ?? null, frequency: phase?.frequency ?? null })],
  ['gainMargin', ({ margins: { gain } }) => ({ value: gain?.factor ?? null, frequency: gain?.frequency ?? null })],
  ['delayMargin', ({ margins: { delay } }) => ({ value: delay?.seconds ?? null, frequency: delay?.frequency ?? null })],
];

const placeOf = (frequency: number | null, units: ReaderUnits): string =>
  frequency === null ? '' : `at ${withUnit(formatFrequency(frequency, units.frequency), units.frequency)}`;

/** Ms and the margins as the strip prints them. A margin that does not exist is "no limit": numerics.md says so of a null. */
export function marginNumbers(analysis: Analysis, units: ReaderUnits): MarginNumber[] {
  return readings.map(([quantity, read]) => {
    const { value, frequency } = read(analysis);
    return {
      quantity,
      name: quantityName(quantity),
      value: value === null ? 'no limit' : quantityText(quantity, value, units).text,
      place: value === null ? '' : placeOf(frequency, units),
    };
  });
}
