import { and, eq } from 'drizzle-orm';
import type { Role } from '@/contract';
import type { Database } from '../open';
import { projectMember } from '../tables';

/** Someone's role in a project, null where they have none. */
export function roleIn(db: Database, projectId: string, userId: string): Role | null {
  const seat = db
    .select({ role: projectMember.role })
    .from(projectMember)
    .where(and(eq(projectMember.projectId, projectId), eq(projectMember.userId, userId)))
    .get();
  return seat?.role ?? null;
}
