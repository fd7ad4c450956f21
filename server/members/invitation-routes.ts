import { AcceptedInvitation, Id, Invitation, InvitationToken, OpenedInvitation, page, PageQuery } from '@/contract';
import { stampNow } from '../activity/stamp-now';
import { inProject } from '../http/paths';
import { route } from '../http/route';
import { postLetter } from '../mail/post-letter';
import { countInvitation } from './count-invitation';
import { accept, invitationsOf, inviteAgain, openInvitation, readInvitation, takeBackInvitation } from './invitation-service';

const tag = 'Members';
const ofInvitation = inProject.extend({ invitationId: Id });

export const invitationRoutes = [
  route({
    method: 'get',
    path: '/api/projects/:projectId/invitations',
    summary: 'Invitations that wait for an account or for a confirmed address, newest first',
    tag,
    access: { project: 'manage', whileArchived: true },
    input: { params: inProject, query: PageQuery },
    output: page(Invitation),
    handler: ({ context, project, query }) => invitationsOf(context.db, project.id, query),
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/invitations/:invitationId/resend',
    summary: 'Sends an invitation again with a new link; the old one opens nothing any more',
    tag,
    access: { project: 'manage' },
    input: { params: ofInvitation },
    output: Invitation,
    handler: ({ context, user, params }) => {
      countInvitation(context, user, openInvitation(context.db, params).email);
      const { invitation, letter } = inviteAgain(context, params, stampNow(user));
      postLetter(context, letter);
      return invitation;
    },
  }),
  route({
    method: 'delete',
    path: '/api/projects/:projectId/invitations/:invitationId',
    summary: 'Takes an invitation back',
    tag,
    access: { project: 'manage', whileArchived: true },
    input: { params: ofInvitation },
    output: null,
    handler: ({ context, user, params }) => takeBackInvitation(context.db, params, stampNow(user)),
  }),
  route({
    method: 'post',
    path: '/api/invitations/read',
    summary: 'What a mailed invitation says: the project, the role, and who invites whom',
    tag,
    access: 'public',
    input: { body: InvitationToken },
    output: OpenedInvitation,
    handler: ({ context, body }) => readInvitation(context.db, body.token),
  }),
  route({
    method: 'post',
    path: '/api/invitations/accept',
    summary: 'Joins by a mailed invitation, once, with the account of the address that it went to; confirms that address',
    tag,
    access: 'session',
    idempotent: false,
    input: { body: InvitationToken },
    output: AcceptedInvitation,
    handler: ({ context, user, body }) => accept(context.db, body.token, user.id),
  }),
];
