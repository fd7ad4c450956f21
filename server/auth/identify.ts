import type { Request } from 'express';
import type { Context } from '../context';
import { callHeaders } from './call-headers';
import type { SignedIn } from './signed-in';

export interface Identity {
  readonly user: SignedIn | null;
  /** A session in use is renewed once a day, its cookie with it. */
  readonly setCookies: string[];
}

/** Who the session cookie of a request belongs to; nobody where there is none, or it is over. */
export async function identify({ auth }: Pick<Context, 'auth'>, request: Request): Promise<Identity> {
  if (!request.get('cookie')) return { user: null, setCookies: [] };
  const { headers, response } = await auth.api.getSession({ headers: callHeaders(request), returnHeaders: true });
  const setCookies = headers.getSetCookie();
  if (!response) return { user: null, setCookies };
  const { id, name, email, emailVerified } = response.user;
  return { user: { id, name, email, emailVerified, sessionId: response.session.id }, setCookies };
}
