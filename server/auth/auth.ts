import { randomUUID } from 'node:crypto';
import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import type { Logger } from 'pino';
import { passwordLength } from '@/contract';
import type { Database } from '@/db/open';
import { ensureTeam } from '@/db/stores/team-store';
import { account, session, user, verification } from '@/db/tables';
import type { Config } from '../config';
import { resetLetter, verificationLetter } from '../mail/letters';
import type { Mailer } from '../mail/mailer';
import type { Message } from '../mail/message';
import { postLetter } from '../mail/post-letter';
import { joinWhereInvited } from '../members/join';
import { ADDRESS_HEADER } from './call-headers';

interface AuthParts {
  readonly config: Config;
  readonly db: Database;
  readonly mailer: Mailer;
  readonly log: Logger;
}

const HOUR_S = 3600;
const DAY_S = 24 * HOUR_S;

/**
 * Passwords, sessions and mailed tokens. Only the routes beside this file call it: its own router is not mounted, so that
 * what is reachable is what we validate, limit, describe and test.
 */
export function createAuth({ config, db, mailer, log }: AuthParts) {
  const post = async (letter: Message) => postLetter({ mailer, log }, letter);
  return betterAuth({
    appName: 'Kerbline',
    baseURL: config.baseUrl,
    basePath: '/api/auth',
    secret: config.secret,
    telemetry: { enabled: false },
    database: drizzleAdapter(db, { provider: 'sqlite', schema: { user, session, account, verification } }),
    logger: { level: 'warn', log: (level, message) => log[level]({ part: 'auth' }, message) },
    // Limits are the routes' own: this limiter starts its window anew with every request, and calls from code pass it by.
    rateLimit: { enabled: false },
    advanced: {
      useSecureCookies: config.baseUrl.startsWith('https:'),
      cookiePrefix: 'kerbline',
      defaultCookieAttributes: { httpOnly: true, sameSite: 'lax' },
      database: { generateId: () => randomUUID() },
      ipAddress: { ipAddressHeaders: [ADDRESS_HEADER] },
    },
    session: { expiresIn: 30 * DAY_S, updateAge: DAY_S },
    emailAndPassword: {
      enabled: true,
      minPasswordLength: passwordLength.least,
      maxPasswordLength: passwordLength.most,
      revokeSessionsOnPasswordReset: true,
      resetPasswordTokenExpiresIn: HOUR_S,
      sendResetPassword: ({ user: { name, email }, token }) =>
        post(resetLetter({ name, email, url: `${config.baseUrl}/reset-password?token=${token}` })),
    },
    emailVerification: {
      sendOnSignUp: true,
      expiresIn: DAY_S,
      sendVerificationEmail: ({ user: { name, email }, url }) => post(verificationLetter({ name, email, url })),
      afterEmailVerification: async ({ id }) => joinWhereInvited(db, id),
    },
    databaseHooks: {
      session: {
        create: {
          // Sign-up ends with a session, so nobody ever works without a team or waits for a project, also where the process died in between.
          before: async ({ userId }) => {
            ensureTeam(db, userId);
            joinWhereInvited(db, userId);
          },
        },
      },
    },
  });
}

export type Auth = ReturnType<typeof createAuth>;
