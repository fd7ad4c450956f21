import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import type { CreateDesign, DesignRevision, ReviseDesign, RevisedDesign } from '@/contract';
import { createDesign, findDesign, reviseDesign, type DesignKey } from '@/db/stores/design-store';
import type { Stamp } from '@/db/stores/stamp';
import { activityEntry } from '../activity/activity-entry';
import { analyseDesign } from '../analyses/analyse-design';
import { freezeInputs } from '../analyses/freeze-inputs';
import { openAnalysis } from '../analyses/analysis-service';
import { overCases } from '../analyses/over-cases';
import type { Context } from '../context';
import { NotFound } from '../http/problem';
import { staleRevision } from '../http/stale-revision';
import { checkDesign } from './check-design';

type Parts = Pick<Context, 'db' | 'jobs'>;

/** @throws NotFound */
export function openDesign({ db }: Pick<Parts, 'db'>, key: DesignKey, revision: number | null = null): DesignRevision {
  const found = findDesign(db, key, revision);
  if (!found) throw new NotFound();
  return found;
}

/** Enters a design with its first revision. @throws LoopRefused where the engine cannot compute it */
export async function enterDesign(
  parts: Parts,
  projectId: string,
  { name, note, ...content }: z.output<typeof CreateDesign>,
  stamp: Stamp,
): Promise<DesignRevision> {
  await checkDesign(parts.jobs, content);
  const designId = randomUUID();
  const activity = activityEntry('design.created', `entered the design ${name}`, note);
  createDesign(parts.db, { projectId, designId, name, content, note, activity, stamp });
  return openDesign(parts, { projectId, designId });
}

/**
 * Adds a revision, and with `analyse` its analysis over all cases: both are written, or neither.
 * @throws NotFound, LoopRefused as enterDesign, Conflict where `baseRevision` is not the latest or there is no case to analyse
 */
export async function addDesignRevision(
  parts: Parts,
  key: DesignKey,
  { baseRevision, analyse, note, name, ...content }: z.output<typeof ReviseDesign>,
  stamp: Stamp,
): Promise<RevisedDesign> {
  const before = openDesign(parts, key);
  if (before.revision !== baseRevision) throw staleRevision(before.revision);
  await checkDesign(parts.jobs, content);
  const revision = baseRevision + 1;
  const design = { id: key.designId, name: name ?? before.name, revision, ...content };
  const inputs = analyse ? await freezeInputs(parts, key.projectId, design) : null;
  const analysis = inputs && (await analyseDesign(parts.jobs, { projectId: key.projectId, inputs, stamp }));
  const analysed = analysis ? ` and analysed it ${overCases(analysis)}` : '';
  const activity = activityEntry('design.revised', `changed the design ${design.name} to revision ${revision}${analysed}`, note);
  const revised = { ...key, name: design.name, content, note, activity, stamp };
  if (!reviseDesign(parts.db, revised, { baseRevision, analysis })) throw staleRevision(openDesign(parts, key).revision);
  const kept = openDesign(parts, key, revision);
  return analysis ? { ...kept, analysis: openAnalysis(parts, { projectId: key.projectId, analysisId: analysis.id }) } : kept;
}
