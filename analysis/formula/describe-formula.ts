import type { Loop } from '@/contract';
import { describePlant, describeRational, type PlantDescription } from '@/analysis/loop/describe-plant';
import { readFormula } from './read-formula';

/**
 * Reads any plant back, a formula too. @see describePlant
 * @throws LoopError where the plant has no meaning
 */
export const describeFormula = (plant: Loop['plant']): PlantDescription => {
  if (plant.kind !== 'formula') return describePlant(plant);
  const { rational, deadTime } = readFormula(plant.text, plant.parameters);
  return describeRational(rational, deadTime);
};
