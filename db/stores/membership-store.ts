import { and, eq } from 'drizzle-orm';
import type { Role } from '@/contract';
import type { Database } from '../open';
import { project, projectMember } from '../tables';

/** What a member of a project is there, and whether the project is archived. */
export interface Seat {
  readonly role: Role;
  readonly archived: boolean;
}

/** Someone's seat in a project, null where they have none. Read with every request: a role that was taken is gone at once. */
export function seatIn(db: Database, projectId: string, userId: string): Seat | null {
  const seat = db
    .select({ role: projectMember.role, archived: project.archived })
    .from(projectMember)
    .innerJoin(project, eq(project.id, projectMember.projectId))
    .where(and(eq(projectMember.projectId, projectId), eq(projectMember.userId, userId)))
    .get();
  return seat ?? null;
}
