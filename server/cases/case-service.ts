import { randomUUID } from 'node:crypto';
import { mostCases, type Case, type CaseContent, type UpdateCase } from '@/contract';
import { addCases, deleteCase, findCase, updateCase, type CaseKey, type KeptCase } from '@/db/stores/case-store';
import type { Stamp } from '@/db/stores/stamp';
import { activityEntry } from '../activity/activity-entry';
import type { Context } from '../context';
import { changedMeanwhile, etagOf } from '../http/etag';
import { Conflict, Meaningless, NotFound } from '../http/problem';
import { atParameters, chosenPlant, refuseUnknownParameters, tryParameters } from './case-plant';

type Parts = Pick<Context, 'db' | 'jobs'>;

export const seenCase = ({ version, ...kept }: KeptCase): Case => ({ ...kept, etag: etagOf(version) });

/** @throws NotFound */
export function openCase({ db }: Pick<Parts, 'db'>, key: CaseKey): KeptCase {
  const found = findCase(db, key);
  if (!found) throw new NotFound();
  return found;
}

/** @throws NotFound for the plant, Meaningless for its revision or a parameter that it has not or that leaves it no meaning */
async function checkContent({ db, jobs }: Parts, projectId: string, content: CaseContent): Promise<void> {
  const plant = chosenPlant(db, projectId, content);
  refuseUnknownParameters(plant, content.parameters);
  try {
    await tryParameters(jobs, plant, content.parameters);
  } catch (error) {
    throw atParameters(error, content.parameters);
  }
}

export const tooManyCases = () =>
  new Meaningless([{ pointer: '#', detail: `A project has at most ${mostCases} cases: delete some, or replace them.` }]);

/** Adds one case behind the others. @throws as checkContent, Meaningless where there are 400 already */
export async function addCase(parts: Parts, projectId: string, content: CaseContent, stamp: Stamp): Promise<Case> {
  await checkContent(parts, projectId, content);
  const added = { id: randomUUID(), ...content };
  const activity = activityEntry('case.added', `added the case ${content.name}`);
  if (!addCases(parts.db, { projectId, cases: [added], replace: false, most: mostCases, activity, stamp })) throw tooManyCases();
  return seenCase(openCase(parts, { projectId, caseId: added.id }));
}

interface CaseChange {
  readonly key: CaseKey;
  readonly changes: UpdateCase;
  readonly stamp: Stamp;
}

/** Changes what is named of a case. @throws as checkContent, Problem 412 where another change came first */
export async function changeCase(parts: Parts, before: KeptCase, { key, changes, stamp }: CaseChange): Promise<Case> {
  const changed = { ...before, ...changes };
  const { id: _id, version: _version, ...content } = changed;
  await checkContent(parts, key.projectId, content);
  const activity = activityEntry('case.changed', `changed the case ${changed.name}`);
  if (!updateCase(parts.db, key, changed, { activity, stamp })) throw changedMeanwhile();
  return seenCase(openCase(parts, key));
}

/** Takes a case away; kept analyses keep it. @throws Conflict for the last one, Problem 412 where another change came first */
export function removeCase({ db }: Pick<Parts, 'db'>, key: CaseKey, { name, version }: KeptCase, stamp: Stamp): void {
  const activity = activityEntry('case.removed', `took away the case ${name}`);
  const outcome = deleteCase(db, key, version, { activity, stamp });
  if (outcome === 'last') throw new Conflict('This is the project’s last case: change it, or add another first.');
  if (outcome === 'stale') throw changedMeanwhile();
}
