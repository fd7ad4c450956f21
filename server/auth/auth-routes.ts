import { z } from 'zod';
import { AskReset, ChangePassword, Me, ResetPasswordByToken, SendVerification, SignIn, SignUp, VerifyEmail } from '@/contract';
import { readMe } from '../account/me-service';
import { answer } from '../http/answer';
import { Problem } from '../http/problem';
import { route } from '../http/route';
import { asking } from './auth-problem';
import { callHeaders } from './call-headers';
import { addressKey, attempt, limits } from './limits';

const tag = 'Sign-in';
const access = 'public';

/** Where the link in a sign-up's mail ends. */
const VERIFIED = '/account?verified=1';

const withCookies = <Body>(body: Body, headers: Headers) => answer(body, { headers: { 'Set-Cookie': headers.getSetCookie() } });

export const authRoutes = [
  route({
    method: 'post',
    path: '/api/auth/sign-up/email',
    summary: 'Make an account and a team of one’s own, and sign in',
    tag,
    access,
    input: { body: SignUp },
    output: Me,
    handler: async ({ context: { auth, db }, body, request }) => {
      attempt(db, limits.signUp, addressKey(request.ip));
      const call = auth.api.signUpEmail({ body: { ...body, callbackURL: VERIFIED }, headers: callHeaders(request), returnHeaders: true });
      const { headers, response } = await asking(call);
      return withCookies(readMe(db, response.user.id), headers);
    },
  }),
  route({
    method: 'post',
    path: '/api/auth/sign-in/email',
    summary: 'Sign in',
    tag,
    access,
    input: { body: SignIn },
    output: Me,
    handler: async ({ context: { auth, db }, body, request }) => {
      attempt(db, limits.signIn, addressKey(request.ip));
      // Counted before the password is looked at, so that many guesses at once are no way round the limit.
      const succeeded = attempt(db, limits.failedSignIn, body.email.toLowerCase());
      const { headers, response } = await asking(auth.api.signInEmail({ body, headers: callHeaders(request), returnHeaders: true }));
      succeeded();
      return withCookies(readMe(db, response.user.id), headers);
    },
  }),
  route({
    method: 'post',
    path: '/api/auth/sign-out',
    summary: 'End this session',
    tag,
    access,
    output: null,
    handler: async ({ context: { auth }, request }) => {
      const { headers } = await asking(auth.api.signOut({ headers: callHeaders(request), returnHeaders: true }));
      return withCookies(undefined, headers);
    },
  }),
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
  route({
    method: 'post',
    path: '/api/auth/send-verification-email',
    summary: 'Ask for another mail that confirms one’s address',
    tag,
    access: 'session',
    idempotent: false,
    input: { body: SendVerification },
    output: null,
    handler: async ({ context: { auth, db }, body, user, request }) => {
      attempt(db, limits.mailReceived, user.email);
      await asking(auth.api.sendVerificationEmail({ body: { callbackURL: VERIFIED, ...body }, headers: callHeaders(request) }));
    },
  }),
  route({
    method: 'get',
    path: '/api/auth/verify-email',
    summary: 'Where the mailed link leads: confirms the address, then goes on to a page of the site',
    tag,
    access,
    input: { query: VerifyEmail },
    output: z.null(),
    status: 302,
    handler: async ({ context: { auth, config }, query, request }) => {
      const landing = new URL(query.callbackURL, config.baseUrl);
      try {
        await asking(auth.api.verifyEmail({ query: { token: query.token }, headers: callHeaders(request) }));
      } catch (error) {
        if (!(error instanceof Problem)) throw error;
        landing.search = '?verified=0';
      }
      return answer(null, { headers: { Location: `${landing.pathname}${landing.search}` } });
    },
  }),
];
