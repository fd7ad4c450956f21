import { and, asc, eq } from 'drizzle-orm';
import type { PageQuery, Role } from '@/contract';
import type { Database } from '../open';
import { projectMember, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import { after, rowsFor, toPage, type Page } from './keyset';
import type { ActivityEntry, Stamp } from './stamp';

export interface MemberKey {
  readonly projectId: string;
  readonly userId: string;
}

/** A member with address and version; who may see the address is the service's to say. */
export interface KeptMember {
  readonly userId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly since: Date;
  readonly version: number;
}

const members = (db: Database) =>
  db
    .select({
      userId: projectMember.userId,
      name: user.name,
      email: user.email,
      role: projectMember.role,
      since: projectMember.createdAt,
      version: projectMember.version,
    })
    .from(projectMember)
    .innerJoin(user, eq(user.id, projectMember.userId));

const owned = ({ projectId, userId }: MemberKey) => and(eq(projectMember.projectId, projectId), eq(projectMember.userId, userId));

/** Who belongs to a project, the oldest membership first. */
export function listMembers(db: Database, projectId: string, page: PageQuery): Page<KeptMember> {
  const rows = members(db)
    .where(and(eq(projectMember.projectId, projectId), after(projectMember.createdAt, projectMember.userId, page)))
    .orderBy(asc(projectMember.createdAt), asc(projectMember.userId))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.since, row.userId], item: (row) => row });
}

export const findMember = (db: Database, key: MemberKey): KeptMember | undefined => members(db).where(owned(key)).get();

export function addMember(within: Database, member: MemberKey & { readonly role: Role }, at: Date): void {
  within
    .insert(projectMember)
    .values({ ...member, createdAt: at })
    .run();
}

interface SeatChange extends MemberKey {
  /** The version that whoever changes it saw. */
  readonly version: number;
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

/** `stale`: another change came first. `lastOwner`: nobody would be left who manages the project. Either way nothing is written. */
export type SeatOutcome = 'done' | 'stale' | 'lastOwner';

function isLastOwner(within: Database, { projectId, userId }: MemberKey): boolean {
  const owners = within
    .select({ userId: projectMember.userId })
    .from(projectMember)
    .where(and(eq(projectMember.projectId, projectId), eq(projectMember.role, 'owner')))
    .all();
  return owners.length === 1 && owners[0].userId === userId;
}

const seen = (change: SeatChange) => and(owned(change), eq(projectMember.version, change.version));

/** Gives a member another role. */
export function changeRole(db: Database, change: SeatChange, role: Role): SeatOutcome {
  return transact(db, (within) => {
    if (role !== 'owner' && isLastOwner(within, change)) return 'lastOwner';
    const written = within
      .update(projectMember)
      .set({ role, version: change.version + 1 })
      .where(seen(change))
      .run();
    if (written.changes === 0) return 'stale';
    recordActivity(within, change.projectId, change.activity, change.stamp);
    return 'done';
  });
}

/** Takes a member out of the project. */
export function removeMember(db: Database, change: SeatChange): SeatOutcome {
  return transact(db, (within) => {
    if (isLastOwner(within, change)) return 'lastOwner';
    if (within.delete(projectMember).where(seen(change)).run().changes === 0) return 'stale';
    recordActivity(within, change.projectId, change.activity, change.stamp);
    return 'done';
  });
}
