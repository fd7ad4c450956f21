import type { Check } from '@/contract';
import { demandedText, quantityText, type ReaderUnits } from '@/figures/quantity-text';

type Demand = Pick<Check, 'quantity' | 'bound' | 'limit'>;

/** "at most 1.70" */
export const demandText = ({ quantity, bound, limit }: Demand, units: ReaderUnits): string =>
  `at ${bound === 'max' ? 'most' : 'least'} ${demandedText(quantity, limit, units)}`;

/** "≤ 1.70", where room is short and the words stand elsewhere. */
export const demandSign = ({ quantity, bound, limit }: Demand, units: ReaderUnits): string =>
  `${bound === 'max' ? '≤' : '≥'} ${demandedText(quantity, limit, units)}`;

/** A null of a check is what numerics.md says: no finite limit where it passes, and nothing that could be computed elsewhere. */
export function checkValueText({ quantity, value, verdict }: Check, units: ReaderUnits): string {
  if (value !== null) return quantityText(quantity, value, units).text;
  return verdict === 'pass' ? 'no limit' : '–';
}
