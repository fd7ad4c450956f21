import type { FrozenCase, KeptPlant, PlantModel } from '@/contract';
import { runnablePlant } from './runnable-plant';

/** What a case says of gain and dead time. A formula that names such a parameter itself has it in its text already. */
function overridesOf({ plant }: Pick<KeptPlant, 'plant'>, parameters: FrozenCase['parameters']): { gainFactor: number; deadTime?: number } {
  const own = plant.kind === 'formula' ? plant.parameters : {};
  const { gainFactor, deadTime } = parameters;
  return {
    gainFactor: Object.hasOwn(own, 'gainFactor') ? 1 : (gainFactor ?? 1),
    ...(deadTime === undefined || Object.hasOwn(own, 'deadTime') ? {} : { deadTime }),
  };
}

/**
 * The plant of one case, ready to run: its gain times `gainFactor`, and `deadTime` in place of its own, s. A formula's own
 * parameters stand in its text and reading already.
 *
 * @throws TypeError for a formula that nobody read: its dead time stands inside the text
 */
export function overridePlant(kept: Pick<KeptPlant, 'plant' | 'reading'>, parameters: FrozenCase['parameters']): PlantModel {
  const plant = runnablePlant(kept);
  const { gainFactor, deadTime } = overridesOf(kept, parameters);
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
