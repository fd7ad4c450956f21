import { engineVersion } from '@/analysis';
import { judgeCases } from '@/analysis/project';
import type { Analysis, KeptAnalysis, Recomputed } from '@/contract';
import { findAnalysis } from '@/db/stores/analysis-store';
import type { Context } from '../context';
import { NotFound } from '../http/problem';
import { computeCase, computeNumbers } from './compute-numbers';
import { hashResults } from './hash-results';
import { numberDifferences } from './number-differences';

type Parts = Pick<Context, 'db' | 'jobs'>;

export interface AnalysisKey {
  readonly projectId: string;
  readonly analysisId: string;
}

/** Another version of the engine may round otherwise; the same one may not. */
const OTHER_ENGINE_TOLERANCE = 1e-9;

/** @throws NotFound */
export function openAnalysis({ db }: Pick<Parts, 'db'>, key: AnalysisKey): KeptAnalysis {
  const kept = findAnalysis(db, key);
  if (!kept) throw new NotFound();
  return kept;
}

/** A case with its curves, computed from what was frozen. @throws NotFound */
export async function caseCurves(parts: Parts, key: AnalysisKey, caseId: string): Promise<Analysis> {
  const { inputs } = openAnalysis(parts, key);
  const frozen = inputs.cases.find(({ id }) => id === caseId);
  if (!frozen) throw new NotFound();
  return computeCase(parts.jobs, inputs.design, frozen);
}

/** Computes an analysis from its frozen inputs once more and says where it came out otherwise. @throws NotFound */
export async function recompute(parts: Parts, key: AnalysisKey): Promise<Recomputed> {
  const kept = openAnalysis(parts, key);
  const { design, cases } = kept.inputs;
  const numbers = await computeNumbers(parts.jobs, design, cases, { responses: true });
  const { results } = judgeCases(design, kept.inputs, numbers);
  const resultHash = hashResults(results);
  const tolerance = kept.engineVersion === engineVersion ? 0 : OTHER_ENGINE_TOLERANCE;
  const differences = results.flatMap((now, index) =>
    numberDifferences(now.case.name, { kept: kept.results[index].numbers, now: now.numbers }, tolerance),
  );
  return { same: resultHash === kept.resultHash || (tolerance > 0 && differences.length === 0), engineVersion, resultHash, differences };
}
