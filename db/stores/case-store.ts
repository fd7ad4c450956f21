import { and, asc, count, eq, max } from 'drizzle-orm';
import type { Case, PageQuery } from '@/contract';
import type { Database } from '../open';
import { projectCase } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import { beyond, rowsFor, toPage, type Page } from './keyset';
import type { ActivityEntry, Stamp } from './stamp';

export interface CaseKey {
  readonly projectId: string;
  readonly caseId: string;
}

/** A case before it is written. */
export type NewCase = Omit<Case, 'etag'>;
/** A case with the number of its edits, of which its ETag is made. */
export type KeptCase = NewCase & { readonly version: number };

interface Change {
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

const columns = {
  id: projectCase.id,
  name: projectCase.name,
  plantId: projectCase.plantId,
  plantRevision: projectCase.plantRevision,
  parameters: projectCase.parameters,
  axes: projectCase.axes,
  basis: projectCase.basis,
  version: projectCase.version,
};

const owned = ({ projectId, caseId }: CaseKey) => and(eq(projectCase.projectId, projectId), eq(projectCase.id, caseId));

/** The project's cases in their own order. */
export function listCases(db: Database, projectId: string, page: PageQuery): Page<KeptCase> {
  const rows = db
    .select({ ...columns, position: projectCase.position })
    .from(projectCase)
    .where(and(eq(projectCase.projectId, projectId), beyond(projectCase.position, page)))
    .orderBy(asc(projectCase.position))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.position, row.id], item: ({ position: _position, ...kept }) => kept });
}

/** Every case of the project in its order, for an analysis over all of them. */
export const allCases = (db: Database, projectId: string): KeptCase[] =>
  db.select(columns).from(projectCase).where(eq(projectCase.projectId, projectId)).orderBy(asc(projectCase.position)).all();

export const findCase = (db: Database, key: CaseKey): KeptCase | undefined => db.select(columns).from(projectCase).where(owned(key)).get();

export function countCases(db: Database, projectId: string): number {
  const [{ cases }] = db.select({ cases: count() }).from(projectCase).where(eq(projectCase.projectId, projectId)).all();
  return cases;
}

/** Adds cases behind the others, within the transaction that also writes what they belong to. */
export function insertCases(within: Database, projectId: string, added: readonly NewCase[], at: Date): void {
  const [{ last }] = within
    .select({ last: max(projectCase.position) })
    .from(projectCase)
    .where(eq(projectCase.projectId, projectId))
    .all();
  const next = (last ?? -1) + 1;
  // One row a statement: SQLite binds a limited number of values in one.
  added.forEach((row, index) => {
    within
      .insert(projectCase)
      .values({ ...row, projectId, position: next + index, createdAt: at, updatedAt: at })
      .run();
  });
}

interface Addition extends Change {
  readonly projectId: string;
  readonly cases: readonly NewCase[];
  /** Takes the place of all cases that there are. */
  readonly replace: boolean;
  /** How many cases a project may have. */
  readonly most: number;
}

/** Adds all of these cases; false, and nothing written, where the project would have more than `most`. */
export function addCases(db: Database, { projectId, cases, replace, most, activity, stamp }: Addition): boolean {
  return transact(db, (within) => {
    if (replace) within.delete(projectCase).where(eq(projectCase.projectId, projectId)).run();
    else if (countCases(within, projectId) + cases.length > most) return false;
    insertCases(within, projectId, cases, stamp.at);
    recordActivity(within, projectId, activity, stamp);
    return true;
  });
}

/** Changes a case that still has the version its editor saw; false, and nothing written, where it has not. */
export function updateCase(db: Database, key: CaseKey, { id: _id, version, ...content }: KeptCase, { activity, stamp }: Change): boolean {
  return transact(db, (within) => {
    const { changes } = within
      .update(projectCase)
      .set({ ...content, version: version + 1, updatedAt: stamp.at })
      .where(and(owned(key), eq(projectCase.version, version)))
      .run();
    if (changes === 0) return false;
    recordActivity(within, key.projectId, activity, stamp);
    return true;
  });
}

/** Deletes a case that still has this version, unless it is the project's last. */
export function deleteCase(db: Database, key: CaseKey, version: number, { activity, stamp }: Change): 'deleted' | 'stale' | 'last' {
  return transact(db, (within) => {
    if (countCases(within, key.projectId) === 1) return 'last';
    const { changes } = within
      .delete(projectCase)
      .where(and(owned(key), eq(projectCase.version, version)))
      .run();
    if (changes === 0) return 'stale';
    recordActivity(within, key.projectId, activity, stamp);
    return 'deleted';
  });
}
