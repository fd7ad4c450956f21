import { and, desc, eq } from 'drizzle-orm';
import type { AnalysisSummary, CaseResult, FrozenInputs, Headline, KeptAnalysis, PageQuery, Room, Verdict } from '@/contract';
import type { Database } from '../open';
import { analysis, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import { before, rowsFor, toPage, type Page } from './keyset';
import type { ActivityEntry, Stamp } from './stamp';

export interface NewAnalysis {
  readonly id: string;
  readonly projectId: string;
  readonly engineVersion: string;
  readonly contentHash: string;
  readonly resultHash: string;
  readonly verdict: Verdict;
  readonly headline: Headline;
  readonly room: Room;
  readonly inputs: FrozenInputs;
  readonly results: CaseResult[];
  readonly stamp: Stamp;
}

const summaryColumns = {
  id: analysis.id,
  inputs: analysis.inputs,
  engineVersion: analysis.engineVersion,
  contentHash: analysis.contentHash,
  resultHash: analysis.resultHash,
  createdAt: analysis.createdAt,
  createdBy: user.name,
  verdict: analysis.verdict,
  headline: analysis.headline,
  room: analysis.room,
};

type SummaryRow = Omit<AnalysisSummary, 'design' | 'plants' | 'caseCount' | 'createdAt'> & {
  inputs: FrozenInputs;
  createdAt: Date;
};

/** An analysis that was kept before cases had a basis and projects an operating range said nothing of them. */
const completed = (inputs: FrozenInputs): FrozenInputs => ({
  ...inputs,
  cases: inputs.cases.map((kept) => ({ ...kept, basis: kept.basis ?? 'extrapolated' })),
  operatingRange: inputs.operatingRange ?? [],
});

/** Each plant revision once, however many cases stand on it. */
function plantsOf({ cases }: FrozenInputs): AnalysisSummary['plants'] {
  const plants = cases.map(({ plant: { id, name, revision } }) => ({ id, name, revision }));
  return [...new Map(plants.map((plant) => [`${plant.id} ${plant.revision}`, plant])).values()];
}

function toSummary({ inputs, createdAt, ...row }: SummaryRow): AnalysisSummary {
  const { id, name, revision } = inputs.design;
  return {
    ...row,
    design: { id, name, revision },
    createdAt: createdAt.toISOString(),
    caseCount: inputs.cases.length,
    plants: plantsOf(inputs),
  };
}

/** The project's analyses without inputs and results, newest first. */
export function listAnalyses(db: Database, projectId: string, page: PageQuery): Page<AnalysisSummary> {
  const rows = db
    .select(summaryColumns)
    .from(analysis)
    .innerJoin(user, eq(user.id, analysis.createdBy))
    .where(and(eq(analysis.projectId, projectId), before(analysis.createdAt, analysis.id, page)))
    .orderBy(desc(analysis.createdAt), desc(analysis.id))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.createdAt, row.id], item: toSummary });
}

export function findAnalysis(db: Database, { projectId, analysisId }: { projectId: string; analysisId: string }): KeptAnalysis | undefined {
  const row = db
    .select({ ...summaryColumns, results: analysis.results })
    .from(analysis)
    .innerJoin(user, eq(user.id, analysis.createdBy))
    .where(and(eq(analysis.projectId, projectId), eq(analysis.id, analysisId)))
    .get();
  if (!row) return undefined;
  const { results, ...summary } = row;
  return { ...toSummary(summary), inputs: completed(summary.inputs), results };
}

/** Writes an analysis within the transaction that also writes what it belongs to. */
export function insertAnalysis(within: Database, { stamp, ...kept }: NewAnalysis): void {
  const { id: designId, revision: designRevision } = kept.inputs.design;
  within
    .insert(analysis)
    .values({ ...kept, designId, designRevision, createdBy: stamp.by, createdAt: stamp.at })
    .run();
}

export function createAnalysis(db: Database, kept: NewAnalysis, activity: ActivityEntry): void {
  transact(db, (within) => {
    insertAnalysis(within, kept);
    recordActivity(within, kept.projectId, activity, kept.stamp);
  });
}
