import type { z } from 'zod';
import { engineVersion } from '@/analysis';
import type { Analysis, CreateAnalysis, KeptAnalysis, Recomputed } from '@/contract';
import { createAnalysis, findAnalysis } from '@/db/stores/analysis-store';
import { findDesign } from '@/db/stores/design-store';
import type { Stamp } from '@/db/stores/stamp';
import type { Context } from '../context';
import { NotFound } from '../http/problem';
import { activityEntry } from '../activity/activity-entry';
import { analyseDesign } from './analyse-design';
import { overCases } from './over-cases';
import { computeCase, computeResults } from './compute-results';
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

/**
 * Analyses a design revision, the latest where none is named, over cases of the project and keeps the result.
 * @throws NotFound for a design or case that is not in the project, Conflict without cases, Meaningless where the engine refuses
 */
export async function keepAnalysis(
  parts: Parts,
  projectId: string,
  { designId, designRevision, caseIds }: z.output<typeof CreateAnalysis>,
  stamp: Stamp,
): Promise<KeptAnalysis> {
  const design = findDesign(parts.db, { projectId, designId }, designRevision ?? null);
  if (!design) throw new NotFound('There is no such design revision in this project.');
  const kept = await analyseDesign(parts, { projectId, design, caseIds, stamp });
  const summary = `analysed ${design.name}, revision ${design.revision}, ${overCases(kept)}`;
  createAnalysis(parts.db, kept, activityEntry('analysis.kept', summary));
  return openAnalysis(parts, { projectId, analysisId: kept.id });
}

/** A case with its curves, computed from what was frozen. @throws NotFound */
export async function caseCurves(parts: Parts, key: AnalysisKey, caseId: string): Promise<Analysis> {
  const { inputs } = openAnalysis(parts, key);
  const frozen = inputs.cases.find(({ id }) => id === caseId);
  if (!frozen) throw new NotFound();
  return computeCase(parts.jobs, inputs, frozen, { curves: true });
}

/** Computes an analysis from its frozen inputs once more and says where it came out otherwise. @throws NotFound */
export async function recompute(parts: Parts, key: AnalysisKey): Promise<Recomputed> {
  const kept = openAnalysis(parts, key);
  const results = await computeResults(parts.jobs, kept.inputs);
  const resultHash = hashResults(results);
  const tolerance = kept.engineVersion === engineVersion ? 0 : OTHER_ENGINE_TOLERANCE;
  const differences = results.flatMap(({ case: { name }, numbers }, index) =>
    numberDifferences(name, { kept: kept.results[index].numbers, now: numbers }, tolerance),
  );
  return { same: resultHash === kept.resultHash || (tolerance > 0 && differences.length === 0), engineVersion, resultHash, differences };
}
