import type { RequestHandler } from 'express';
import { NotAllowed } from './problem';

const reading = new Set(['GET', 'HEAD', 'OPTIONS']);

const hostOf = (origin: string | undefined) => (origin !== undefined && URL.canParse(origin) ? new URL(origin).host : null);

/** A cookie goes along from any page; only our own pages may change things with it. */
export const refuseOtherOrigins =
  (baseUrl: string): RequestHandler =>
  (request, _response, next) => {
    const host = hostOf(request.get('origin'));
    const own = host !== null && (host === request.get('host') || host === new URL(baseUrl).host);
    next(reading.has(request.method) || own ? undefined : new NotAllowed('Requests that change something must come from this site.'));
  };
