import { z } from 'zod';
import { SendVerification, VerifyEmail } from '@/contract';
import { answer } from '../http/answer';
import { Problem } from '../http/problem';
import { route } from '../http/route';
import { asking } from './auth-problem';
import { callHeaders } from './call-headers';
import { attempt, limits } from './limits';

const tag = 'Sign-in';

/** Where the link in a mail ends unless someone asked for another page. */
export const VERIFIED = '/verified';

export const verificationRoutes = [
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
    access: 'public',
    input: { query: VerifyEmail },
    output: z.null(),
    status: 302,
    handler: async ({ context: { auth, config }, query, request }) => {
      const landing = new URL(query.callbackURL, config.baseUrl);
      try {
        await asking(auth.api.verifyEmail({ query: { token: query.token }, headers: callHeaders(request) }));
      } catch (error) {
        if (!(error instanceof Problem)) throw error;
        landing.search = '?error=link';
      }
      return answer(null, { headers: { Location: `${landing.pathname}${landing.search}` } });
    },
  }),
];
