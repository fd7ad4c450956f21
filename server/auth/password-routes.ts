import { AskReset, ChangePassword, ResetPasswordByToken } from '@/contract';
import { route } from '../http/route';
import { asking } from './auth-problem';
import { callHeaders } from './call-headers';
import { addressKey, attempt, limits } from './limits';
import { withCookies } from './with-cookies';

const tag = 'Sign-in';
const access = 'public';

export const passwordRoutes = [
  route({
    method: 'post',
    path: '/api/auth/request-password-reset',
    summary: 'Ask for a mail with a link to choose a new password; answers the same whether the address is known or not',
    tag,
    access,
    input: { body: AskReset },
    output: null,
    handler: async ({ context: { auth, db }, body, request }) => {
      attempt(db, limits.mailAsked, addressKey(request.ip));
      attempt(db, limits.mailReceived, body.email.toLowerCase());
      await asking(auth.api.requestPasswordReset({ body: { email: body.email }, headers: callHeaders(request) }));
    },
  }),
  route({
    method: 'post',
    path: '/api/auth/reset-password',
    summary: 'Choose a new password by the mailed token, once; every session ends',
    tag,
    access,
    input: { body: ResetPasswordByToken },
    output: null,
    handler: async ({ context: { auth }, body }) => {
      await asking(auth.api.resetPassword({ body }));
    },
  }),
  route({
    method: 'post',
    path: '/api/auth/change-password',
    summary: 'Change one’s password; every other session ends',
    tag,
    access: 'session',
    idempotent: false,
    input: { body: ChangePassword },
    output: null,
    handler: async ({ context: { auth, db }, body, user, request }) => {
      const succeeded = attempt(db, limits.failedSignIn, user.email);
      const call = auth.api.changePassword({
        body: { ...body, revokeOtherSessions: true },
        headers: callHeaders(request),
        returnHeaders: true,
      });
      const { headers } = await asking(call);
      succeeded();
      return withCookies(undefined, headers);
    },
  }),
];
