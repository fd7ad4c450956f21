import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import { gridCases, gridIssues, parameterNames, type GridCase } from '@/analysis/project';
import { mostCases, type Case, type CreateGrid, type PlantRevision } from '@/contract';
import { addCases, countCases, findCase } from '@/db/stores/case-store';
import type { Stamp } from '@/db/stores/stamp';
import { activityEntry } from '../activity/activity-entry';
import type { Context } from '../context';
import { pointerOf } from '../http/issues';
import { Meaningless } from '../http/problem';
import type { LoopPool } from '../jobs/loop-pool';
import { LoopRefused } from '../jobs/refusals';
import { chosenPlant, tryParameters } from './case-plant';
import { seenCase, tooManyCases } from './case-service';

type Grid = z.output<typeof CreateGrid>;

function refuseOverfull(there: number, size: number): void {
  if (there + size <= mostCases) return;
  const detail = `There are ${there} cases, and a project has at most ${mostCases}: this grid adds ${size}; ${mostCases - there} fit.`;
  throw new Meaningless([{ pointer: '/lists', detail }]);
}

async function checkCase(jobs: LoopPool, plant: PlantRevision, { name, parameters }: GridCase): Promise<void> {
  try {
    await tryParameters(jobs, plant, parameters);
  } catch (error) {
    if (!(error instanceof LoopRefused)) throw error;
    throw new Meaningless([{ pointer: '/lists', detail: `In the case “${name}”: ${error.error.detail}` }]);
  }
}

/**
 * Makes a case of every combination of the lists' points: all of them, or none.
 * @throws NotFound for the plant, Meaningless for its revision, for a parameter and for more cases than are allowed
 */
export async function addGrid({ db, jobs }: Pick<Context, 'db' | 'jobs'>, projectId: string, grid: Grid, stamp: Stamp): Promise<Case[]> {
  const { plantId, plantRevision, lists, replace } = grid;
  const plant = chosenPlant(db, projectId, grid);
  const issues = gridIssues(lists, parameterNames(plant.plant));
  if (issues.length > 0)
    throw new Meaningless(issues.map(({ path, message }) => ({ pointer: pointerOf(['lists', ...path]), detail: message })));
  const made = gridCases(lists);
  if (!replace) refuseOverfull(countCases(db, projectId), made.length);
  await Promise.all(made.map((one) => checkCase(jobs, plant, one)));

  const cases = made.map((one) => ({ id: randomUUID(), plantId, plantRevision, ...one }));
  const activity = activityEntry('case.grid', `${replace ? 'replaced all cases by' : 'added'} a grid of ${cases.length}`);
  if (!addCases(db, { projectId, cases, replace, most: mostCases, activity, stamp })) throw tooManyCases();
  return cases.flatMap(({ id }) => findCase(db, { projectId, caseId: id }) ?? []).map(seenCase);
}
