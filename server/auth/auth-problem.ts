import { isAPIError } from 'better-auth/api';
import { Conflict, Meaningless, NotSignedIn, Problem } from '../http/problem';

const at = (pointer: string, detail: string) => () => new Meaningless([{ pointer, detail }]);
const linkIsOver = at('/token', 'This link was used already or is too old. Ask for a new one.');

/** What better-auth refuses, by its code, in our words and at our fields. */
const problems: Readonly<Record<string, () => Problem>> = {
  INVALID_EMAIL_OR_PASSWORD: () => new NotSignedIn('That e-mail and password do not match.'),
  USER_ALREADY_EXISTS: at('/email', 'There is an account with this address already.'),
  USER_ALREADY_EXISTS_USE_ANOTHER_EMAIL: at('/email', 'There is an account with this address already.'),
  INVALID_PASSWORD: at('/currentPassword', 'That is not your password now.'),
  INVALID_TOKEN: linkIsOver,
  TOKEN_EXPIRED: linkIsOver,
  EMAIL_MISMATCH: at('/email', 'This is not the address you signed up with.'),
  EMAIL_ALREADY_VERIFIED: () => new Conflict('This address is confirmed already.'),
};

/** Runs a call to better-auth; throws its refusals as problems. */
export async function asking<T>(call: Promise<T>): Promise<T> {
  try {
    return await call;
  } catch (error) {
    if (!isAPIError(error) || error.statusCode >= 500) throw error;
    const known = problems[error.body?.code ?? ''];
    throw known ? known() : new Problem(error.statusCode, error.body?.message ?? 'This was refused.');
  }
}
