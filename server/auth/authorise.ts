import { allows } from '@/contract';
import type { Database } from '@/db/open';
import { seatIn } from '@/db/stores/membership-store';
import { Archived, NotAllowed, NotFound, NotSignedIn } from '../http/problem';
import type { Access, ProjectSeat } from '../http/route';
import type { SignedIn } from './signed-in';

/**
 * Lets a call through, with the caller's seat where the route is inside a project.
 * @throws NotSignedIn; NotFound where the project is not there or not theirs to know of; NotAllowed where their role is too small;
 *   Conflict where it would change an archived project
 */
export function authorise(db: Database, access: Access, user: SignedIn | null, projectId: unknown): ProjectSeat | null {
  if (access === 'public') return null;
  if (!user) throw new NotSignedIn();
  if (access === 'session') return null;
  const seat = typeof projectId === 'string' ? seatIn(db, projectId, user.id) : null;
  if (!seat) throw new NotFound();
  if (!allows(seat.role, access.project)) throw new NotAllowed();
  if (seat.archived && access.project !== 'read' && !access.whileArchived) throw new Archived();
  return { id: projectId as string, role: seat.role };
}
