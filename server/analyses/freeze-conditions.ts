import type { Conditions, FrozenCase, PlantRevision } from '@/contract';
import type { Database } from '@/db/open';
import { allCases, type KeptCase } from '@/db/stores/case-store';
import { readLimits } from '@/db/stores/limits-store';
import { operatingRangeOf } from '@/db/stores/operating-range-store';
import { findPlant } from '@/db/stores/plant-store';
import { plantInCase, refuseUnknownParameters } from '../cases/case-plant';
import type { Context } from '../context';
import { Conflict, NotFound, Problem } from '../http/problem';
import type { LoopPool } from '../jobs/loop-pool';

interface Placed {
  readonly kept: KeptCase;
  readonly plant: PlantRevision;
}

function chosenCases(db: Database, projectId: string, caseIds: readonly string[] | undefined): KeptCase[] {
  const cases = allCases(db, projectId);
  if (caseIds === undefined) return cases;
  const chosen = new Set(caseIds);
  const found = cases.filter(({ id }) => chosen.has(id));
  if (found.length < chosen.size) throw new NotFound('One of these cases is not in this project.');
  return found;
}

/** Each case with its plant, each plant revision read once. */
function placedOn(db: Database, projectId: string, cases: readonly KeptCase[]): Placed[] {
  const read = new Map<string, PlantRevision | undefined>();
  return cases.map((kept) => {
    const { plantId, plantRevision } = kept;
    const key = `${plantId} ${plantRevision}`;
    if (!read.has(key)) read.set(key, findPlant(db, { projectId, plantId }, plantRevision));
    const plant = read.get(key);
    if (!plant) throw new NotFound(`The plant revision of the case “${kept.name}” is not there.`);
    return { kept, plant };
  });
}

async function freezeCase(jobs: LoopPool, { kept, plant }: Placed): Promise<FrozenCase> {
  const { plantId: _plantId, plantRevision: _plantRevision, version: _version, ...frozen } = kept;
  try {
    refuseUnknownParameters(plant, kept.parameters);
    return { ...frozen, plant: await plantInCase(jobs, plant, kept.parameters) };
  } catch (error) {
    // The plant has moved on since the case was made: the case has to be changed before anything can be said.
    if (error instanceof Problem && error.status === 422)
      throw new Conflict(`The case “${kept.name}” does not go with its plant any more. ${error.message}`);
    throw error;
  }
}

/**
 * Everything a design of the project is judged against, in full, as it stands now.
 *
 * @param caseIds all cases of the project where absent
 * @throws NotFound for a case that is not in it, Conflict where a case's parameters do not go with its plant any more
 */
export async function freezeConditions(
  { db, jobs }: Pick<Context, 'db' | 'jobs'>,
  projectId: string,
  caseIds?: readonly string[],
): Promise<Conditions> {
  const placed = placedOn(db, projectId, chosenCases(db, projectId, caseIds));
  const { items: limits } = readLimits(db, projectId).limits;
  const operatingRange = operatingRangeOf(db, projectId);
  return { cases: await Promise.all(placed.map((one) => freezeCase(jobs, one))), limits, operatingRange };
}
