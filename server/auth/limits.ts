import { ipKeyGenerator } from 'express-rate-limit';
import type { Database } from '@/db/open';
import { countAttempt, takeBackAttempt } from '@/db/stores/rate-limit-store';
import { TooMany } from '../http/problem';

export interface Limit {
  readonly name: string;
  readonly most: number;
  readonly windowMs: number;
}

const MINUTE_MS = 60_000;

export const limits = {
  signUp: { name: 'sign-up', most: 30, windowMs: MINUTE_MS },
  signIn: { name: 'sign-in', most: 30, windowMs: MINUTE_MS },
  failedSignIn: { name: 'failed-sign-in', most: 10, windowMs: 15 * MINUTE_MS },
  mailAsked: { name: 'mail-asked', most: 10, windowMs: MINUTE_MS },
  mailReceived: { name: 'mail-received', most: 5, windowMs: 15 * MINUTE_MS },
  invitationSent: { name: 'invitation-sent', most: 60, windowMs: 60 * MINUTE_MS },
  invitationReceived: { name: 'invitation-received', most: 5, windowMs: 15 * MINUTE_MS },
} as const satisfies Record<string, Limit>;

/** One customer's network is one caller: an IPv6 address counts by its first 64 bits. */
export const addressKey = (address: string | undefined) => ipKeyGenerator(address ?? 'unknown', 64);

/**
 * Counts one attempt of `who`.
 * @returns a function that takes it back
 * @throws TooMany once there were more than the limit within its window
 */
export function attempt(db: Database, limit: Limit, who: string): () => void {
  const key = `${limit.name}:${who}`;
  const { count, windowEndsAt } = countAttempt(db, key, limit.windowMs);
  if (count > limit.most)
    throw new TooMany('That was tried too often. Wait a little, then try again.', (windowEndsAt.getTime() - Date.now()) / 1000);
  return () => takeBackAttempt(db, key);
}
