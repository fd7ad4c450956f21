import type { z } from 'zod';
import { allows, type CreateAnalysis, type FrozenInputs, type JobAnswer, type KeptAnalysis } from '@/contract';
import { createAnalysis } from '@/db/stores/analysis-store';
import { findDesign } from '@/db/stores/design-store';
import { seatIn } from '@/db/stores/membership-store';
import type { Stamp } from '@/db/stores/stamp';
import { activityEntry } from '../activity/activity-entry';
import type { Context } from '../context';
import { NotFound } from '../http/problem';
import type { Watch } from '../jobs/in-turn';
import { analyseDesign, workIn } from './analyse-design';
import { openAnalysis } from './analysis-service';
import { freezeInputs } from './freeze-inputs';
import { overCases } from './over-cases';

type Parts = Pick<Context, 'db' | 'jobs'>;

interface Asked {
  readonly projectId: string;
  readonly choice: z.output<typeof CreateAnalysis>;
  readonly stamp: Stamp;
}

/** The design revision that is asked for and everything it is judged against, frozen. @throws as keepAnalysis */
async function freezeAsked(parts: Parts, { projectId, choice: { designId, designRevision, caseIds } }: Asked): Promise<FrozenInputs> {
  const design = findDesign(parts.db, { projectId, designId }, designRevision ?? null);
  if (!design) throw new NotFound('There is no such design revision in this project.');
  return freezeInputs(parts, projectId, design, caseIds);
}

/** Whoever lost their place in the project meanwhile keeps nothing in it any more. */
function expectStillEditor({ db }: Pick<Parts, 'db'>, { projectId, stamp }: Asked): void {
  const seat = seatIn(db, projectId, stamp.by);
  if (!seat || seat.archived || !allows(seat.role, 'edit')) throw new NotFound();
}

async function compute(parts: Parts, asked: Asked, { inputs, watch }: { inputs: FrozenInputs; watch?: Watch }): Promise<string> {
  const { projectId, stamp } = asked;
  const kept = await analyseDesign(parts.jobs, { projectId, inputs, stamp, watch });
  watch?.signal?.throwIfAborted();
  expectStillEditor(parts, asked);
  const { name, revision } = inputs.design;
  createAnalysis(parts.db, kept, activityEntry('analysis.kept', `analysed ${name}, revision ${revision}, ${overCases(kept)}`));
  return kept.id;
}

/**
 * Analyses a design revision, the latest where none is named, over cases of the project and keeps the result.
 * @throws NotFound for a design or case that is not in the project, Conflict without cases, Meaningless where the engine refuses
 */
export async function keepAnalysis(parts: Parts, asked: Asked): Promise<KeptAnalysis> {
  const analysisId = await compute(parts, asked, { inputs: await freezeAsked(parts, asked) });
  return openAnalysis(parts, { projectId: asked.projectId, analysisId });
}

/** As keepAnalysis, and what takes longer than `answerWithinMs` goes on as a job. @throws as keepAnalysis, TooMany */
export async function startAnalysis(parts: Parts & Pick<Context, 'board' | 'config'>, asked: Asked): Promise<KeptAnalysis | JobAnswer> {
  const { projectId } = asked;
  const inputs = await freezeAsked(parts, asked);
  const posted = parts.board.post({
    owner: asked.stamp.by,
    kind: 'analysis',
    total: workIn(inputs),
    work: async (watch) => ({ projectId, analysisId: await compute(parts, asked, { inputs, watch }) }),
  });
  const result = await posted.within(parts.config.answerWithinMs);
  return result ? openAnalysis(parts, result) : { job: posted.now() };
}
