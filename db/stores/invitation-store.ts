import { and, desc, eq, gt } from 'drizzle-orm';
import type { InvitedRole, PageQuery } from '@/contract';
import type { Database } from '../open';
import { project, projectInvitation, projectMember, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import { before, rowsFor, toPage, type Page } from './keyset';
import { addMember } from './member-store';
import type { ActivityEntry, Stamp } from './stamp';

export interface InvitationKey {
  readonly projectId: string;
  readonly invitationId: string;
}

export interface KeptInvitation {
  readonly id: string;
  readonly email: string;
  readonly role: InvitedRole;
  readonly invitedBy: string;
  readonly createdAt: Date;
  readonly sentAt: Date;
  readonly expiresAt: Date;
}

const columns = {
  id: projectInvitation.id,
  email: projectInvitation.email,
  role: projectInvitation.role,
  invitedBy: user.name,
  createdAt: projectInvitation.createdAt,
  sentAt: projectInvitation.sentAt,
  expiresAt: projectInvitation.expiresAt,
};

const invitations = (db: Database) => db.select(columns).from(projectInvitation).innerJoin(user, eq(user.id, projectInvitation.invitedBy));

const owned = ({ projectId, invitationId }: InvitationKey) =>
  and(eq(projectInvitation.projectId, projectId), eq(projectInvitation.id, invitationId));

/** Invitations that wait, the newest first; also those that have run out, which can be sent again. */
export function listInvitations(db: Database, projectId: string, page: PageQuery): Page<KeptInvitation> {
  const rows = invitations(db)
    .where(and(eq(projectInvitation.projectId, projectId), before(projectInvitation.createdAt, projectInvitation.id, page)))
    .orderBy(desc(projectInvitation.createdAt), desc(projectInvitation.id))
    .limit(rowsFor(page))
    .all();
  return toPage(rows, page, { keyOf: (row) => [row.createdAt, row.id], item: (row) => row });
}

export const findInvitation = (db: Database, key: InvitationKey): KeptInvitation | undefined => invitations(db).where(owned(key)).get();

/** The invitation that a mailed token opens, with its project's name; undefined where it is used, taken back or too old. */
export function openByToken(db: Database, tokenHash: string): (KeptInvitation & { readonly project: string }) | undefined {
  return db
    .select({ ...columns, project: project.name })
    .from(projectInvitation)
    .innerJoin(user, eq(user.id, projectInvitation.invitedBy))
    .innerJoin(project, eq(project.id, projectInvitation.projectId))
    .where(and(eq(projectInvitation.tokenHash, tokenHash), gt(projectInvitation.expiresAt, new Date())))
    .get();
}

interface NewInvitation extends InvitationKey {
  readonly email: string;
  readonly role: InvitedRole;
  readonly tokenHash: string;
  readonly expiresAt: Date;
  /** What the project's history says, by the name of whoever joined at once; null where the invitation waits. */
  readonly entryFor: (name: string | null) => ActivityEntry;
  readonly stamp: Stamp;
}

/** `waits` for an account with a confirmed address, or `joined` at once because there is one; else nothing is written. */
export type InviteOutcome = 'waits' | 'joined' | 'isMember' | 'isInvited';

const personAt = (within: Database, email: string) =>
  within.select({ id: user.id, name: user.name, verified: user.emailVerified }).from(user).where(eq(user.email, email)).get();

/** Asks an address into a project. */
export function createInvitation(db: Database, { invitationId, entryFor, stamp, ...asked }: NewInvitation): InviteOutcome {
  const { projectId, email, role } = asked;
  return transact(db, (within) => {
    const person = personAt(within, email);
    const member = person && and(eq(projectMember.projectId, projectId), eq(projectMember.userId, person.id));
    if (member && within.select({ role: projectMember.role }).from(projectMember).where(member).get()) return 'isMember';
    const waiting = and(eq(projectInvitation.projectId, projectId), eq(projectInvitation.email, email));
    if (within.select({ id: projectInvitation.id }).from(projectInvitation).where(waiting).get()) return 'isInvited';
    recordActivity(within, projectId, entryFor(person?.verified ? person.name : null), stamp);
    if (person?.verified) {
      addMember(within, { projectId, userId: person.id, role }, stamp.at);
      return 'joined';
    }
    const times = { createdAt: stamp.at, sentAt: stamp.at };
    within
      .insert(projectInvitation)
      .values({ ...asked, ...times, id: invitationId, invitedBy: stamp.by })
      .run();
    return 'waits';
  });
}

interface InvitationChange extends InvitationKey {
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

/** Puts a new token in the place of the old one, which opens nothing from now on; false where the invitation is gone. */
export function renewInvitation(db: Database, change: InvitationChange, token: { tokenHash: string; expiresAt: Date }): boolean {
  const { projectId, activity, stamp } = change;
  return transact(db, (within) => {
    const renewed = { ...token, sentAt: stamp.at };
    if (within.update(projectInvitation).set(renewed).where(owned(change)).run().changes === 0) return false;
    recordActivity(within, projectId, activity, stamp);
    return true;
  });
}

/** Takes an invitation back; false where it is gone. */
export function deleteInvitation(db: Database, change: InvitationChange): boolean {
  const { projectId, activity, stamp } = change;
  return transact(db, (within) => {
    if (within.delete(projectInvitation).where(owned(change)).run().changes === 0) return false;
    recordActivity(within, projectId, activity, stamp);
    return true;
  });
}
