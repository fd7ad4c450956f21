import { and, desc, eq } from 'drizzle-orm';
import type { DesignContent, DesignRevision, PageQuery } from '@/contract';
import type { Database } from '../open';
import { design, designRevision, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import { insertAnalysis, type NewAnalysis } from './analysis-store';
import { before, below, rowsFor, toPage, type Page } from './keyset';
import type { ActivityEntry, Stamp } from './stamp';

export interface DesignKey {
  readonly projectId: string;
  readonly designId: string;
}

interface NewRevision extends DesignKey {
  readonly name: string;
  readonly content: DesignContent;
  readonly note?: string;
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

const columns = {
  id: design.id,
  name: design.name,
  revision: designRevision.revision,
  content: designRevision.content,
  note: designRevision.note,
  createdAt: designRevision.createdAt,
  createdBy: user.name,
  authorId: designRevision.createdBy,
};

const revisions = (db: Database) =>
  db
    .select(columns)
    .from(designRevision)
    .innerJoin(design, eq(design.id, designRevision.designId))
    .innerJoin(user, eq(user.id, designRevision.createdBy));

type Row = Omit<DesignRevision, keyof DesignContent | 'createdAt'> & { content: DesignContent; createdAt: Date };
const toRevision = ({ content, createdAt, ...row }: Row): DesignRevision => ({ ...row, ...content, createdAt: createdAt.toISOString() });

const owned = ({ projectId, designId }: DesignKey) => and(eq(design.projectId, projectId), eq(design.id, designId));
const isLatest = eq(designRevision.revision, design.latestRevision);

/** The project's designs as they are now, the one revised last first. */
export function listDesigns(db: Database, projectId: string, page: PageQuery): Page<DesignRevision> {
  const rows = revisions(db)
    .where(and(eq(design.projectId, projectId), isLatest, before(designRevision.createdAt, design.id, page)))
    .orderBy(desc(designRevision.createdAt), desc(design.id))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.createdAt, row.id], item: toRevision });
}

/** One revision of a design, the latest where none is named. */
export function findDesign(db: Database, key: DesignKey, revision: number | null = null): DesignRevision | undefined {
  const which = revision === null ? isLatest : eq(designRevision.revision, revision);
  const row = revisions(db)
    .where(and(owned(key), which))
    .get();
  return row && toRevision(row);
}

/** A design's revisions, newest first. */
export function listDesignRevisions(db: Database, key: DesignKey, page: PageQuery): Page<DesignRevision> {
  const rows = revisions(db)
    .where(and(owned(key), below(designRevision.revision, page)))
    .orderBy(desc(designRevision.revision))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.revision, row.id], item: toRevision });
}

function insertRevision(within: Database, revision: number, { designId, content, note, stamp }: NewRevision): void {
  within.insert(designRevision).values({ designId, revision, content, note, createdBy: stamp.by, createdAt: stamp.at }).run();
}

/** Writes a design with its first revision. */
export function createDesign(db: Database, created: NewRevision): void {
  const { projectId, designId, name, stamp } = created;
  transact(db, (within) => {
    within.insert(design).values({ id: designId, projectId, name, latestRevision: 1, createdAt: stamp.at, updatedAt: stamp.at }).run();
    insertRevision(within, 1, created);
    recordActivity(within, projectId, created.activity, stamp);
  });
}

/**
 * Writes the revision after `baseRevision`, and its analysis with it or neither.
 * False, and nothing written, where `baseRevision` is no longer the latest.
 */
export function reviseDesign(
  db: Database,
  revised: NewRevision,
  { baseRevision, analysis }: { baseRevision: number; analysis: NewAnalysis | null },
): boolean {
  const { projectId, name, stamp } = revised;
  return transact(db, (within) => {
    const { changes } = within
      .update(design)
      .set({ name, latestRevision: baseRevision + 1, updatedAt: stamp.at })
      .where(and(owned(revised), eq(design.latestRevision, baseRevision)))
      .run();
    if (changes === 0) return false;
    insertRevision(within, baseRevision + 1, revised);
    recordActivity(within, projectId, revised.activity, stamp);
    if (analysis) insertAnalysis(within, analysis);
    return true;
  });
}
