import { aDesign, aPlant, made } from '../../../../support/a-project';
import type { Ids } from '../row';
import type { World } from '../world';

interface Named {
  readonly id: string;
}

const at = ({ ours }: World) => `/api/projects/${ours.projectId}`;

/** Things of the project that a call may use up. */
export const ownPlant = async (world: World): Promise<Ids> => ({
  plantId: (await made<Named>(world.cast.owner, `${at(world)}/plants`, aPlant)).id,
});

export const ownDesign = async (world: World): Promise<Ids> => ({
  designId: (await made<Named>(world.cast.owner, `${at(world)}/designs`, aDesign)).id,
});

export const ownCase = async (world: World): Promise<Ids> => ({
  caseId: (await made<Named>(world.cast.owner, `${at(world)}/cases`, { name: 'At the kerb', plantId: world.ours.plantId })).id,
});
