import { ChangeMember, Id, Invitation, InviteMember, Member, page, PageQuery } from '@/contract';
import { stampNow } from '../activity/stamp-now';
import { answer } from '../http/answer';
import { inProject } from '../http/paths';
import { route } from '../http/route';
import { postLetter } from '../mail/post-letter';
import { countInvitation } from './count-invitation';
import { invite } from './invitation-service';
import { endMembership, giveRole, membersOf, openMember } from './member-service';

const tag = 'Members';
const ofMember = inProject.extend({ userId: Id });
const withTag = (member: Member) => answer(member, { etag: member.etag });

export const memberRoutes = [
  route({
    method: 'get',
    path: '/api/projects/:projectId/members',
    summary: 'Who belongs to a project; addresses are told to owners',
    tag,
    access: { project: 'read' },
    input: { params: inProject, query: PageQuery },
    output: page(Member),
    handler: ({ context, user, project, query }) => membersOf(context.db, { userId: user.id, seat: project }, query),
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/members',
    summary: 'Invites an address by e-mail; a member once an account with this address, confirmed, exists',
    tag,
    access: { project: 'manage' },
    input: { params: inProject, body: InviteMember },
    output: Invitation,
    status: 201,
    handler: ({ context, user, project, body }) => {
      countInvitation(context, user, body.email);
      const { invitation, letter } = invite(context, project.id, body, stampNow(user));
      postLetter(context, letter);
      return invitation;
    },
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/members/:userId',
    summary: 'One member',
    tag,
    access: { project: 'read' },
    input: { params: ofMember },
    output: Member,
    handler: ({ context, user, project, params }) => withTag(openMember(context.db, params, { userId: user.id, seat: project })),
  }),
  route({
    method: 'patch',
    path: '/api/projects/:projectId/members/:userId',
    summary: 'Gives a member another role, at once; the last owner stays',
    tag,
    access: { project: 'manage' },
    input: { params: ofMember, body: ChangeMember },
    output: Member,
    handler: ({ context, user, project, params, body, expectVersion }) => {
      const change = { key: params, reader: { userId: user.id, seat: project }, expectVersion, stamp: stampNow(user) };
      return withTag(giveRole(context.db, change, body.role));
    },
  }),
  route({
    method: 'delete',
    path: '/api/projects/:projectId/members/:userId',
    summary: 'Takes a member out, at once, which needs “manage”; whoever names themselves leaves. The last owner stays',
    tag,
    access: { project: 'read' },
    input: { params: ofMember },
    output: null,
    handler: ({ context, user, project, params, expectVersion }) =>
      endMembership(context.db, { key: params, reader: { userId: user.id, seat: project }, expectVersion, stamp: stampNow(user) }),
  }),
];
