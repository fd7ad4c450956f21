import { and, asc, eq, max } from 'drizzle-orm';
import type { Case, PageQuery } from '@/contract';
import type { Database } from '../open';
import { projectCase } from '../tables';
import { beyond, rowsFor, toPage, type Page } from './keyset';

const columns = {
  id: projectCase.id,
  name: projectCase.name,
  plantId: projectCase.plantId,
  plantRevision: projectCase.plantRevision,
  parameters: projectCase.parameters,
  axes: projectCase.axes,
  position: projectCase.position,
};
type Row = Case & { position: number };
const toCase = ({ position: _position, ...row }: Row): Case => row;

/** The project's cases in their own order. */
export function listCases(db: Database, projectId: string, page: PageQuery): Page<Case> {
  const rows = db
    .select(columns)
    .from(projectCase)
    .where(and(eq(projectCase.projectId, projectId), beyond(projectCase.position, page)))
    .orderBy(asc(projectCase.position))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.position, row.id], item: toCase });
}

/** Every case of the project in its order, for an analysis over all of them. */
export function allCases(db: Database, projectId: string): Case[] {
  return db
    .select(columns)
    .from(projectCase)
    .where(eq(projectCase.projectId, projectId))
    .orderBy(asc(projectCase.position))
    .all()
    .map(toCase);
}

/** Adds a case behind the others. */
export function insertCase(within: Database, projectId: string, added: Case, at: Date): void {
  const [{ last }] = within
    .select({ last: max(projectCase.position) })
    .from(projectCase)
    .where(eq(projectCase.projectId, projectId))
    .all();
  within
    .insert(projectCase)
    .values({ ...added, projectId, position: (last ?? -1) + 1, createdAt: at, updatedAt: at })
    .run();
}
