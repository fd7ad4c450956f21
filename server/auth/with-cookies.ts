import { answer } from '../http/answer';

/** An answer that carries the cookies better-auth wants set. */
export const withCookies = <Body>(body: Body, headers: Headers) => answer(body, { headers: { 'Set-Cookie': headers.getSetCookie() } });
