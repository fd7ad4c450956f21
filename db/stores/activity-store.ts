import { and, desc, eq } from 'drizzle-orm';
import type { Activity, PageQuery } from '@/contract';
import type { Database } from '../open';
import { activity, project, user } from '../tables';
import { before, rowsFor, toPage, type Page } from './keyset';
import type { ActivityEntry, Stamp } from './stamp';

/** Adds a line to the project's history; a project that something happened to is the newest in the list. */
export function recordActivity(within: Database, projectId: string, entry: ActivityEntry, stamp: Stamp): void {
  within
    .insert(activity)
    .values({ ...entry, projectId, userId: stamp.by, createdAt: stamp.at })
    .run();
  within.update(project).set({ updatedAt: stamp.at }).where(eq(project.id, projectId)).run();
}

/** What happened to a project, newest first. */
export function listActivity(db: Database, projectId: string, page: PageQuery): Page<Activity> {
  const rows = db
    .select({
      id: activity.id,
      at: activity.createdAt,
      by: user.name,
      action: activity.action,
      summary: activity.summary,
      detail: activity.detail,
    })
    .from(activity)
    .innerJoin(user, eq(user.id, activity.userId))
    .where(and(eq(activity.projectId, projectId), before(activity.createdAt, activity.id, page)))
    .orderBy(desc(activity.createdAt), desc(activity.id))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.at, row.id], item: (row) => ({ ...row, at: row.at.toISOString() }) });
}
