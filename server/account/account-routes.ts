import { z } from 'zod';
import { DeviceSession, Me, page, UpdateMe } from '@/contract';
import { endOtherSessions, endSession, sessionsOf } from '@/db/stores/session-store';
import { NotFound } from '../http/problem';
import { route } from '../http/route';
import { deviceName } from './device';
import { changeMe, readMe } from './me-service';

const tag = 'Account';
const access = 'session';

export const accountRoutes = [
  route({
    method: 'get',
    path: '/api/me',
    summary: 'Who is signed in, with teams and preferences',
    tag,
    access,
    output: Me,
    handler: ({ context, user }) => readMe(context.db, user.id),
  }),
  route({
    method: 'patch',
    path: '/api/me',
    summary: 'Change one’s name or preferences',
    tag,
    access,
    input: { body: UpdateMe },
    output: Me,
    handler: ({ context, user, body }) => changeMe(context.db, user.id, body),
  }),
  route({
    method: 'get',
    path: '/api/me/sessions',
    summary: 'The devices one is signed in on, the last used first',
    tag,
    access,
    output: page(DeviceSession),
    handler: ({ context, user }) => {
      const items = sessionsOf(context.db, user.id).map((session) => ({
        id: session.id,
        current: session.id === user.sessionId,
        device: deviceName(session.userAgent),
        address: session.ipAddress || null,
        createdAt: session.createdAt.toISOString(),
        lastSeenAt: session.updatedAt.toISOString(),
        expiresAt: session.expiresAt.toISOString(),
      }));
      return { items, nextCursor: null };
    },
  }),
  route({
    method: 'delete',
    path: '/api/me/sessions/:sessionId',
    summary: 'Sign one device out',
    tag,
    access,
    input: { params: z.object({ sessionId: z.uuid() }) },
    output: null,
    handler: ({ context, user, params }) => {
      if (!endSession(context.db, user.id, params.sessionId)) throw new NotFound();
    },
  }),
  route({
    method: 'post',
    path: '/api/me/sessions/revoke-others',
    summary: 'Sign every other device out',
    tag,
    access,
    output: null,
    handler: ({ context, user }) => endOtherSessions(context.db, user.id, user.sessionId),
  }),
];
