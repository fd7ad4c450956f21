import { createClient } from '../../../../support/client';
import type { Rows } from '../row';

export const accountRows: Rows = {
  'GET /api/me': { needs: 'session' },
  'PATCH /api/me': { needs: 'session', body: (_ids, { name }) => ({ name }) },
  'GET /api/me/sessions': { needs: 'session' },
  'DELETE /api/me/sessions/{sessionId}': {
    needs: 'session',
    slow: true,
    prepare: async ({ app }, { name, email, password }) => {
      const tablet = createClient(app.url, name);
      await tablet.call('POST', '/api/auth/sign-in/email', { email, password });
      const { body } = await tablet.call<{ items: { id: string; current: boolean }[] }>('GET', '/api/me/sessions');
      return { sessionId: body.items.find(({ current }) => current)!.id };
    },
  },
  'POST /api/me/sessions/revoke-others': { needs: 'session' },
};
