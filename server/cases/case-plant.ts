import { overridePlant, parameterNames, unknownParameter, withOwnParameters } from '@/analysis/project';
import type { CaseParameters, FrozenCase, PlantRevision } from '@/contract';
import type { Database } from '@/db/open';
import { findPlant } from '@/db/stores/plant-store';
import { Meaningless, NotFound } from '../http/problem';
import { pointerOf } from '../http/issues';
import type { LoopPool } from '../jobs/loop-pool';
import { LoopRefused } from '../jobs/refusals';

interface PlantChoice {
  readonly plantId: string;
  readonly plantRevision: number | null;
}

/**
 * The plant revision that a case names, the latest where it names none.
 * @throws NotFound for a plant that is not in the project, Meaningless for a revision that it has not
 */
export function chosenPlant(db: Database, projectId: string, { plantId, plantRevision }: PlantChoice): PlantRevision {
  const latest = findPlant(db, { projectId, plantId });
  if (!latest) throw new NotFound('There is no such plant in this project.');
  const found = plantRevision === null ? latest : findPlant(db, { projectId, plantId }, plantRevision);
  if (!found)
    throw new Meaningless([
      { pointer: '/plantRevision', detail: `${latest.name} has no revision ${plantRevision}; ${latest.revision} is its latest.` },
    ]);
  return found;
}

/**
 * The plant as a case has it: a formula with the case's own values, and what it reads as with them.
 * @throws LoopRefused where those values leave it without meaning
 */
export async function plantInCase(jobs: LoopPool, revision: PlantRevision, parameters: CaseParameters): Promise<FrozenCase['plant']> {
  const { note: _note, createdAt: _createdAt, createdBy: _createdBy, ...kept } = revision;
  const plant = withOwnParameters(kept.plant, parameters);
  return plant === kept.plant ? kept : { ...kept, plant, reading: await jobs.describe(plant) };
}

/** @throws Meaningless at each parameter that the plant has not */
export function refuseUnknownParameters({ plant }: PlantRevision, parameters: CaseParameters): void {
  const names = parameterNames(plant);
  const unknown = Object.keys(parameters).filter((name) => !names.includes(name));
  if (unknown.length > 0)
    throw new Meaningless(unknown.map((name) => ({ pointer: pointerOf(['parameters', name]), detail: unknownParameter(name, names) })));
}

/** Whether the plant keeps its meaning with these parameters. @throws LoopRefused, whose pointer is into the plant */
export async function tryParameters(jobs: LoopPool, revision: PlantRevision, parameters: CaseParameters): Promise<void> {
  const plant = await plantInCase(jobs, revision, parameters);
  await jobs.describe(overridePlant(plant, parameters));
}

/** A refusal of the engine, said of the parameters that brought it about: of the one where there is only one. */
export function atParameters(error: unknown, parameters: CaseParameters): unknown {
  if (!(error instanceof LoopRefused)) return error;
  const names = Object.keys(parameters);
  return new Meaningless([{ pointer: pointerOf(['parameters', ...(names.length === 1 ? names : [])]), detail: error.error.detail }]);
}
