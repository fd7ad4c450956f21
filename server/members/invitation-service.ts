import { randomUUID } from 'node:crypto';
import type { AcceptedInvitation, Invitation, InviteMember, OpenedInvitation, PageQuery } from '@/contract';
import type { Database } from '@/db/open';
import {
  createInvitation,
  deleteInvitation,
  findInvitation,
  listInvitations,
  openByToken,
  renewInvitation,
  type InvitationKey,
  type KeptInvitation,
} from '@/db/stores/invitation-store';
import { acceptInvitation } from '@/db/stores/joining-store';
import type { Page } from '@/db/stores/keyset';
import type { Stamp } from '@/db/stores/stamp';
import { readUser } from '@/db/stores/user-store';
import { activityEntry } from '../activity/activity-entry';
import type { Context } from '../context';
import { Conflict, NotAllowed, NotFound } from '../http/problem';
import { invitationLetter, membershipLetter } from '../mail/letters';
import type { Message } from '../mail/message';
import { openProject } from '../projects/project-service';
import { hashToken, invitationDays, newToken } from './invitation-token';
import { joined } from './join';

type Parts = Pick<Context, 'db' | 'config'>;

/** What was written, and the letter that has to go out. */
export interface Sent {
  readonly invitation: Invitation;
  readonly letter: Message;
}

function toInvitation({ createdAt: _createdAt, sentAt, expiresAt, ...invitation }: KeptInvitation): Invitation {
  return { ...invitation, sentAt: sentAt.toISOString(), expiresAt: expiresAt.toISOString() };
}

export function invitationsOf(db: Database, projectId: string, page: PageQuery): Page<Invitation> {
  const { items, nextCursor } = listInvitations(db, projectId, page);
  return { items: items.map(toInvitation), nextCursor };
}

/** @throws NotFound */
export function openInvitation(db: Database, key: InvitationKey): KeptInvitation {
  const invitation = findInvitation(db, key);
  if (!invitation) throw new NotFound();
  return invitation;
}

const taken = (detail: string) => new Conflict(detail, [{ pointer: '/email', detail }]);

/**
 * Asks an address into a project: a member at once where an account with this confirmed address exists, else as soon as there is one.
 * The answer is the same either way.
 * @throws Conflict where the address is a member's, or is invited already
 */
export function invite({ db, config }: Parts, projectId: string, { email: written, role }: InviteMember, stamp: Stamp): Sent {
  const email = written.toLowerCase();
  const { project } = openProject(db, { projectId, userId: stamp.by });
  const invitedBy = readUser(db, stamp.by).name;
  const { token, kept } = newToken(stamp.at);
  const invitationId = randomUUID();
  const entryFor = (name: string | null) =>
    name === null ? activityEntry('member.invited', `invited someone as ${role}`) : activityEntry('member.added', `made ${name} ${role}`);
  const outcome = createInvitation(db, { invitationId, projectId, email, role, ...kept, entryFor, stamp });
  if (outcome === 'isMember') throw taken('This is the address of a member already.');
  if (outcome === 'isInvited') throw taken('This address is invited already. Send that invitation again, or take it back first.');
  const asked = { email, role, invitedBy, project: project.name };
  return {
    invitation: { id: invitationId, email, role, invitedBy, sentAt: stamp.at.toISOString(), expiresAt: kept.expiresAt.toISOString() },
    letter:
      outcome === 'joined'
        ? membershipLetter({ ...asked, url: `${config.baseUrl}/projects/${projectId}` })
        : invitationLetter({ ...asked, url: `${config.baseUrl}/invitation?token=${token}`, days: invitationDays }),
  };
}

/** Sends an invitation again, with a new link and its full time. @throws NotFound */
export function inviteAgain({ db, config }: Parts, key: InvitationKey, stamp: Stamp): Sent {
  const { role } = openInvitation(db, key);
  const { project } = openProject(db, { projectId: key.projectId, userId: stamp.by });
  const { token, kept } = newToken(stamp.at);
  const activity = activityEntry('invitation.resent', `sent the invitation of someone as ${role} again`);
  if (!renewInvitation(db, { ...key, activity, stamp }, kept)) throw new NotFound();
  const invitation = toInvitation(openInvitation(db, key));
  const url = `${config.baseUrl}/invitation?token=${token}`;
  return { invitation, letter: invitationLetter({ ...invitation, project: project.name, url, days: invitationDays }) };
}

/** Takes an invitation back; its link opens nothing any more. @throws NotFound */
export function takeBackInvitation(db: Database, key: InvitationKey, stamp: Stamp): void {
  const { role } = openInvitation(db, key);
  const activity = activityEntry('invitation.takenBack', `took the invitation of someone as ${role} back`);
  if (!deleteInvitation(db, { ...key, activity, stamp })) throw new NotFound();
}

const linkIsOver = () =>
  new NotFound('This invitation was used already, was taken back or is too old. If you are a member, the project is in your list.');

/** What an invitation says to whoever holds its token. @throws NotFound */
export function readInvitation(db: Database, token: string): OpenedInvitation {
  const found = openByToken(db, hashToken(token));
  if (!found) throw linkIsOver();
  const { project, invitedBy, email, role, expiresAt } = found;
  return { project, invitedBy, email, role, expiresAt: expiresAt.toISOString() };
}

/** Joins by a mailed token. @throws NotFound; NotAllowed where the caller's account has another address than the one invited */
export function accept(db: Database, token: string, userId: string): AcceptedInvitation {
  const outcome = acceptInvitation(db, hashToken(token), joined(userId));
  if (outcome === 'noSuchToken') throw linkIsOver();
  if (outcome === 'otherAddress')
    throw new NotAllowed('This invitation went to another address. Sign in with the account of the address that it was sent to.');
  return outcome;
}
