import { createHash, randomBytes } from 'node:crypto';

const BYTES = 32;
const DAY_MS = 24 * 3600_000;

/** How long a mailed invitation opens its project. */
export const invitationDays = 14;

export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/** A fresh token with what is kept of it. */
export function newToken(at: Date): { token: string; kept: { tokenHash: string; expiresAt: Date } } {
  const token = randomBytes(BYTES).toString('base64url');
  return { token, kept: { tokenHash: hashToken(token), expiresAt: new Date(at.getTime() + invitationDays * DAY_MS) } };
}
