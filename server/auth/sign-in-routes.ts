import { Me, SignIn, SignUp } from '@/contract';
import { readMe } from '../account/me-service';
import { route } from '../http/route';
import { asking } from './auth-problem';
import { callHeaders } from './call-headers';
import { addressKey, attempt, limits } from './limits';
import { VERIFIED } from './verification-routes';
import { withCookies } from './with-cookies';

const tag = 'Sign-in';
const access = 'public';

export const signInRoutes = [
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
];
