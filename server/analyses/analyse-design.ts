import { randomUUID } from 'node:crypto';
import { engineVersion } from '@/analysis';
import { judgeCases } from '@/analysis/project';
import type { FrozenInputs } from '@/contract';
import type { NewAnalysis } from '@/db/stores/analysis-store';
import type { Stamp } from '@/db/stores/stamp';
import type { Watch } from '../jobs/in-turn';
import type { LoopPool } from '../jobs/loop-pool';
import { computeNumbers } from './compute-numbers';
import { computeRoom } from './compute-room';
import { contentHash } from './content-hash';
import { hashResults } from './hash-results';

interface Request {
  readonly projectId: string;
  readonly inputs: FrozenInputs;
  readonly stamp: Stamp;
  readonly watch?: Watch;
}

/** Each case is analysed, and then asked how much room it leaves in three ways. */
export const workIn = ({ cases }: FrozenInputs) => cases.length * 4;

/** Computes and judges frozen inputs: an analysis that only needs to be written. @throws as computeNumbers */
export async function analyseDesign(jobs: LoopPool, { projectId, inputs, stamp, watch = {} }: Request): Promise<NewAnalysis> {
  const { design, cases, limits } = inputs;
  const numbers = await computeNumbers(jobs, design, cases, { ...watch, responses: true });
  const { results, headline } = judgeCases(design, inputs, numbers);
  return {
    id: randomUUID(),
    projectId,
    engineVersion,
    contentHash: contentHash(inputs),
    resultHash: hashResults(results),
    verdict: headline.verdict,
    headline,
    room: await computeRoom(jobs, { design, cases, limits, results }, watch),
    inputs,
    results,
    stamp,
  };
}
