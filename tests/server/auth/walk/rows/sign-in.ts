import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { user } from '@/db/tables';
import { mailedLink } from '../../../../support/mail';
import type { Client } from '../../../../support/client';
import type { Rows } from '../row';
import type { World } from '../world';

const credentials = ({ email, password }: Client) => ({ email, password });

/** The token of a mail that lets the spare person choose a new password. */
async function resetToken({ app, cast }: World): Promise<{ token: string }> {
  await cast.nobody.call('POST', '/api/auth/request-password-reset', { email: cast.spare.email });
  return { token: (await mailedLink(app, cast.spare.email)).searchParams.get('token')! };
}

export const signInRows: Rows = {
  'POST /api/auth/sign-up/email': {
    needs: 'public',
    body: () => ({ name: 'Newcomer', email: `${randomUUID()}@team.example`, password: 'a-newcomer-at-the-kerb' }),
  },
  'POST /api/auth/sign-in/email': {
    needs: 'public',
    prepare: ({ cast }) => credentials(cast.spare),
    body: ({ email, password }) => ({ email, password }),
  },
  'POST /api/auth/sign-out': { needs: 'public' },
  'POST /api/auth/request-password-reset': { needs: 'public', body: () => ({ email: 'nobody@team.example' }) },
  'POST /api/auth/reset-password': {
    needs: 'public',
    prepare: async (world) => ({ ...(await resetToken(world)), newPassword: world.cast.spare.password }),
    body: ({ token, newPassword }) => ({ token, newPassword }),
  },
  'POST /api/auth/change-password': {
    needs: 'session',
    slow: true,
    body: (_ids, { password }) => ({ currentPassword: password, newPassword: password }),
  },
  'POST /api/auth/send-verification-email': {
    needs: 'session',
    prepare: ({ app }, { email }) => {
      app.db.update(user).set({ emailVerified: false }).where(eq(user.email, email)).run();
      return {};
    },
    body: (_ids, { email }) => ({ email }),
  },
  'GET /api/auth/verify-email': { needs: 'public', query: '?token=nonsense' },
};
