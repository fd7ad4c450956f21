import type { FrozenCase, PlantModel } from '@/contract';

/**
 * The plant of one case: its gain times `gainFactor`, and `deadTime` in place of its own, s.
 *
 * @throws TypeError for a formula that nobody read: its dead time stands inside the text
 */
export function overridePlant(plant: PlantModel, { gainFactor = 1, deadTime }: FrozenCase['parameters']): PlantModel {
  if (gainFactor === 1 && deadTime === undefined) return plant;
  switch (plant.kind) {
    case 'coefficients':
      return { ...plant, numerator: plant.numerator.map((coefficient) => coefficient * gainFactor), deadTime: deadTime ?? plant.deadTime };
    case 'roots':
      return { ...plant, gain: plant.gain * gainFactor, deadTime: deadTime ?? plant.deadTime };
    case 'formula':
      throw new TypeError('A formula is read before a case overrides its gain or dead time.');
  }
}
