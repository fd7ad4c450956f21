import type { Request } from 'express';

/** Under this name, which no client can set past us, better-auth hears the caller's address. */
export const ADDRESS_HEADER = 'x-kerbline-address';

/** What better-auth may know of a request: its cookies, its device and its address. */
export function callHeaders(request: Request): Headers {
  const headers = new Headers({ [ADDRESS_HEADER]: request.ip ?? '' });
  for (const name of ['cookie', 'user-agent']) {
    const value = request.get(name);
    if (value) headers.set(name, value);
  }
  return headers;
}
