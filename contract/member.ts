import { z } from 'zod';
import { Email, Id, Role, Timestamp } from './common';

/** Someone with a role in a project. */
export const Member = z
  .object({
    userId: z.string(),
    name: z.string(),
    email: z.string().nullable().meta({ description: 'for owners, and of oneself; null for everyone else' }),
    role: Role,
    since: Timestamp,
    etag: z.string().meta({ description: 'what If-Match says to change or remove this member' }),
  })
  .meta({ id: 'Member' });
export type Member = z.infer<typeof Member>;

/** Ownership is not sent by mail: an owner gives it to someone who is a member. */
export const InvitedRole = z.enum(['editor', 'reviewer', 'viewer']);
export type InvitedRole = z.infer<typeof InvitedRole>;

export const InviteMember = z.strictObject({ email: Email, role: InvitedRole }).meta({ id: 'InviteMember' });
export type InviteMember = z.infer<typeof InviteMember>;

export const ChangeMember = z.strictObject({ role: Role }).meta({ id: 'ChangeMember' });
export type ChangeMember = z.infer<typeof ChangeMember>;

/** Someone asked into a project whose account or confirmed address is still missing. */
export const Invitation = z
  .object({
    id: Id,
    email: z.string(),
    role: InvitedRole,
    invitedBy: z.string(),
    sentAt: Timestamp.meta({ description: 'when its newest mail went out' }),
    expiresAt: Timestamp,
  })
  .meta({ id: 'Invitation' });
export type Invitation = z.infer<typeof Invitation>;

/** The token of a mailed invitation, in a body because addresses end up in logs. */
export const InvitationToken = z.strictObject({ token: z.string().min(1).max(200) }).meta({ id: 'InvitationToken' });
export type InvitationToken = z.infer<typeof InvitationToken>;

/** What a mailed invitation says to whoever holds it. */
export const OpenedInvitation = z
  .object({ project: z.string(), invitedBy: z.string(), email: z.string(), role: InvitedRole, expiresAt: Timestamp })
  .meta({ id: 'OpenedInvitation' });
export type OpenedInvitation = z.infer<typeof OpenedInvitation>;

export const AcceptedInvitation = z.object({ projectId: Id, role: Role }).meta({ id: 'AcceptedInvitation' });
export type AcceptedInvitation = z.infer<typeof AcceptedInvitation>;
