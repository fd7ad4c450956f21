import { and, eq } from 'drizzle-orm';
import type { Limit, Limits } from '@/contract';
import type { Database } from '../open';
import { projectLimits, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import type { ActivityEntry, Stamp } from './stamp';

/** A project's limits with the number of their edits: 0 while nobody demanded anything. */
export interface KeptLimits {
  readonly limits: Limits;
  readonly version: number;
}

export function readLimits(db: Database, projectId: string): KeptLimits {
  const row = db
    .select({
      items: projectLimits.items,
      version: projectLimits.version,
      updatedAt: projectLimits.updatedAt,
      updatedBy: user.name,
    })
    .from(projectLimits)
    .innerJoin(user, eq(user.id, projectLimits.updatedBy))
    .where(eq(projectLimits.projectId, projectId))
    .get();
  if (!row) return { limits: { items: [], updatedAt: null, updatedBy: null }, version: 0 };
  const { version, updatedAt, ...limits } = row;
  return { limits: { ...limits, updatedAt: updatedAt.toISOString() }, version };
}

interface LimitsChange {
  readonly projectId: string;
  readonly version: number;
  readonly items: Limit[];
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

/** Writes limits over the version their editor saw; false, and nothing written, where another edit came first. */
export function writeLimits(db: Database, { projectId, version, items, activity, stamp }: LimitsChange): boolean {
  const written = { items, version: version + 1, updatedBy: stamp.by, updatedAt: stamp.at };
  return transact(db, (within) => {
    const { changes } =
      version === 0
        ? within
            .insert(projectLimits)
            .values({ projectId, ...written })
            .onConflictDoNothing()
            .run()
        : within
            .update(projectLimits)
            .set(written)
            .where(and(eq(projectLimits.projectId, projectId), eq(projectLimits.version, version)))
            .run();
    if (changes === 0) return false;
    recordActivity(within, projectId, activity, stamp);
    return true;
  });
}
