import { describePlant } from '@/analysis';
import type { PlantModel } from '@/contract';
import { exactText, formulaText } from './formula-text';
import type { Notation, NotationText } from './notation';
import { rootsText } from './root-text';

/** A plant that needs no parser. */
export type WorkedOut = Exclude<PlantModel, { kind: 'formula' }>;

/**
 * The fields of a notation that say this plant.
 * @param print how a number is written; shortest without noise in its last digit where absent
 * @throws LoopError where the plant has no meaning
 */
export function writePlant(plant: WorkedOut, notation: Notation, print: (value: number) => string = exactText): Partial<NotationText> {
  if (notation === 'formula') return { formula: formulaText(plant) };
  const deadTime = print(plant.deadTime);
  if (notation === 'coefficients') {
    const { numerator, denominator } = plant.kind === 'coefficients' ? plant : describePlant(plant);
    return { numerator: numerator.map(print).join(', '), denominator: denominator.map(print).join(', '), deadTime };
  }
  const { gain, zeros, poles } = plant.kind === 'roots' ? plant : describePlant(plant);
  return { gain: print(gain), zeros: rootsText(zeros, print), poles: rootsText(poles, print), deadTime };
}
