import { randomUUID } from 'node:crypto';
import type { Project } from '@/contract';
import { addMember, findMember } from '@/db/stores/member-store';
import { projectInvitation } from '@/db/tables';
import { hashToken } from '@/server/members/invitation-token';
import { made } from '../../../../support/a-project';
import type { Client } from '../../../../support/client';
import { invite } from '../../../../support/members';
import type { Ids, Rows } from '../row';
import type { World } from '../world';

const HOUR_MS = 3_600_000;
const stranger = () => ({ email: `${randomUUID()}@team.example` });

async function invited({ cast, ours }: World) {
  const { body } = await invite(cast.owner, `/api/projects/${ours.projectId}`, stranger(), 'viewer');
  return { invitationId: body.id };
}

/** Someone who is in the project to be taken out of it. */
function oneMore({ app, ours, spareId }: World) {
  const key = { projectId: ours.projectId, userId: spareId };
  if (!findMember(app.db, key)) addMember(app.db, { ...key, role: 'viewer' }, new Date());
  return { userId: spareId };
}

/** An invitation that waits for this address, although it is confirmed. */
async function waitingFor({ app, cast, spareId }: World, { email }: Client) {
  const project = await made<Project>(cast.owner, '/api/projects', { name: 'To be joined' });
  const token = randomUUID();
  const at = new Date();
  const times = { createdAt: at, sentAt: at, expiresAt: new Date(at.getTime() + HOUR_MS) };
  const row = { id: randomUUID(), projectId: project.id, email, role: 'viewer', tokenHash: hashToken(token), invitedBy: spareId } as const;
  app.db
    .insert(projectInvitation)
    .values({ ...row, ...times })
    .run();
  return { token };
}

const tokenBody = ({ token }: Ids) => ({ token });

export const memberRows: Rows = {
  'GET /api/projects/{projectId}/members': { needs: 'read' },
  'POST /api/projects/{projectId}/members': { needs: 'manage', body: () => ({ ...stranger(), role: 'viewer' }) },
  'GET /api/projects/{projectId}/members/{userId}': { needs: 'read' },
  'PATCH /api/projects/{projectId}/members/{userId}': { needs: 'manage', body: () => ({ role: 'viewer' }) },
  'DELETE /api/projects/{projectId}/members/{userId}': { needs: 'manage', prepare: oneMore },
  'GET /api/projects/{projectId}/invitations': { needs: 'manage' },
  'POST /api/projects/{projectId}/invitations/{invitationId}/resend': { needs: 'manage' },
  'DELETE /api/projects/{projectId}/invitations/{invitationId}': { needs: 'manage', prepare: invited },
  'POST /api/invitations/read': { needs: 'public', prepare: waitingFor, body: tokenBody },
  'POST /api/invitations/accept': { needs: 'session', prepare: waitingFor, body: tokenBody },
};
