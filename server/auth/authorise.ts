import type { Database } from '@/db/open';
import { roleIn } from '@/db/stores/membership-store';
import { NotAllowed, NotFound, NotSignedIn } from '../http/problem';
import type { Access, ProjectSeat } from '../http/route';
import { allows } from './permissions';
import type { SignedIn } from './signed-in';

/**
 * Lets a call through, with the caller's seat where the route is inside a project.
 * @throws NotSignedIn; NotFound where the project is not there or not theirs to know of; NotAllowed where their role is too small
 */
export function authorise(db: Database, access: Access, user: SignedIn | null, projectId: unknown): ProjectSeat | null {
  if (access === 'public') return null;
  if (!user) throw new NotSignedIn();
  if (access === 'session') return null;
  const role = typeof projectId === 'string' ? roleIn(db, projectId, user.id) : null;
  if (!role) throw new NotFound();
  if (!allows(role, access.project)) throw new NotAllowed();
  return { id: projectId as string, role };
}
