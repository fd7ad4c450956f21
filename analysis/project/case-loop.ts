import type { DesignContent, FrozenCase, KeptPlant, Loop } from '@/contract';
import { overridePlant } from './override-plant';

/**
 * The loop that a design makes in one case: the case's plant with its overrides, under the design's controller.
 * A design stated to be continuous and one whose sample time nobody stated are both computed without sampling;
 * only the verdict tells them apart.
 */
export function caseLoop({ plant, parameters }: { plant: KeptPlant; parameters: FrozenCase['parameters'] }, design: DesignContent): Loop {
  return {
    plant: overridePlant(plant, parameters),
    controller: design.controller,
    sensor: plant.sensor,
    sampling: design.sampling === 'continuous' ? null : design.sampling,
    actuator: design.actuator,
    responses: { duration: null, referenceStep: 1, loadStep: 1 },
    at: [],
  };
}
