import { and, eq, gt } from 'drizzle-orm';
import type { InvitedRole } from '@/contract';
import type { Database } from '../open';
import { projectInvitation, projectMember, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import type { ActivityEntry } from './stamp';

type EntryFor = (role: InvitedRole) => ActivityEntry;

interface Joining {
  readonly userId: string;
  readonly at: Date;
  /** What a project's history says of the new member. */
  readonly entryFor: EntryFor;
}

const personOf = (within: Database, userId: string) =>
  within.select({ email: user.email, verified: user.emailVerified }).from(user).where(eq(user.id, userId)).get();

function joinAll(within: Database, email: string, { userId, at, entryFor }: Joining): void {
  const waiting = within
    .select({ id: projectInvitation.id, projectId: projectInvitation.projectId, role: projectInvitation.role })
    .from(projectInvitation)
    .where(and(eq(projectInvitation.email, email), gt(projectInvitation.expiresAt, at)))
    .all();
  for (const { id, projectId, role } of waiting) {
    within.delete(projectInvitation).where(eq(projectInvitation.id, id)).run();
    const seat = within.insert(projectMember).values({ projectId, userId, role, createdAt: at }).onConflictDoNothing().run();
    if (seat.changes > 0) recordActivity(within, projectId, entryFor(role), { by: userId, at });
  }
}

/** Makes memberships of every invitation that waits for this person, if their address is confirmed. */
export function joinInvited(db: Database, joining: Joining): void {
  transact(db, (within) => {
    const person = personOf(within, joining.userId);
    if (person?.verified) joinAll(within, person.email, joining);
  });
}

export type AcceptOutcome = { readonly projectId: string; readonly role: InvitedRole } | 'noSuchToken' | 'otherAddress';

/**
 * Uses a mailed token up. It went to this address alone, so whoever is signed in under the same address and holds it has
 * confirmed the address: that is written, and everything that waited for it becomes a membership.
 */
export function acceptInvitation(db: Database, tokenHash: string, joining: Joining): AcceptOutcome {
  const { userId, at } = joining;
  return transact(db, (within) => {
    const invitation = within
      .select({ projectId: projectInvitation.projectId, email: projectInvitation.email, role: projectInvitation.role })
      .from(projectInvitation)
      .where(and(eq(projectInvitation.tokenHash, tokenHash), gt(projectInvitation.expiresAt, at)))
      .get();
    if (!invitation) return 'noSuchToken';
    const { email, ...seat } = invitation;
    if (personOf(within, userId)?.email !== email) return 'otherAddress';
    within.update(user).set({ emailVerified: true, updatedAt: at }).where(eq(user.id, userId)).run();
    joinAll(within, email, joining);
    return seat;
  });
}
