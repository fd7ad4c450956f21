import type { CaseParameters, PlantModel } from '@/contract';

/** What a case may say of any plant, whatever its kind. */
const ofEveryPlant = ['gainFactor', 'deadTime'];

const ownNames = (plant: PlantModel) => (plant.kind === 'formula' ? Object.keys(plant.parameters) : []);

/** The names that a case on this plant may set: those of every plant, and its formula's own. */
export const parameterNames = (plant: PlantModel): string[] => [...new Set([...ofEveryPlant, ...ownNames(plant)])];

/** The plant with the case's values of its formula's own parameters; any other plant as it is. */
export function withOwnParameters(plant: PlantModel, parameters: CaseParameters): PlantModel {
  if (plant.kind !== 'formula') return plant;
  const own = ownNames(plant).filter((name) => parameters[name] !== undefined);
  if (own.length === 0) return plant;
  return { ...plant, parameters: { ...plant.parameters, ...Object.fromEntries(own.map((name) => [name, parameters[name]])) } };
}
