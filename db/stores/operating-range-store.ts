import { eq } from 'drizzle-orm';
import type { OperatingRange } from '@/contract';
import type { Database } from '../open';
import { project } from '../tables';

/** Where the project's loop is used; empty where nobody said, or for a project that is not there. */
export function operatingRangeOf(db: Database, projectId: string): OperatingRange[] {
  const row = db.select({ operatingRange: project.operatingRange }).from(project).where(eq(project.id, projectId)).get();
  return row?.operatingRange ?? [];
}
