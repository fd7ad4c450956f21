import { randomUUID } from 'node:crypto';
import { engineVersion } from '@/analysis';
import { headline } from '@/analysis/project';
import type { NewAnalysis } from '@/db/stores/analysis-store';
import type { Stamp } from '@/db/stores/stamp';
import type { Context } from '../context';
import { computeResults } from './compute-results';
import { contentHash } from './content-hash';
import { freezeInputs, type DesignToFreeze } from './freeze-inputs';
import { hashResults } from './hash-results';

interface Request {
  readonly projectId: string;
  readonly design: DesignToFreeze;
  /** All cases of the project where absent. */
  readonly caseIds?: readonly string[];
  readonly stamp: Stamp;
}

/** Freezes the inputs and computes them: an analysis that only needs to be written. @throws as freezeInputs and computeResults */
export async function analyseDesign(
  { db, jobs }: Pick<Context, 'db' | 'jobs'>,
  { projectId, design, caseIds, stamp }: Request,
): Promise<NewAnalysis> {
  const inputs = freezeInputs(db, projectId, design, caseIds);
  const results = await computeResults(jobs, inputs);
  const first = headline(results);
  return {
    id: randomUUID(),
    projectId,
    engineVersion,
    contentHash: contentHash(inputs),
    resultHash: hashResults(results),
    verdict: first.verdict,
    headline: first,
    inputs,
    results,
    stamp,
  };
}
