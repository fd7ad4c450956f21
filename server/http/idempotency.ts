import { createHash } from 'node:crypto';
import { claimKey, forgetKey, keepAnswer } from '@/db/stores/idempotency-store';
import { Answer, answer } from './answer';
import { Conflict, Meaningless, Malformed } from './problem';
import type { AnyVisit, Route } from './route';

const MAX_KEY_LENGTH = 200;

/** Two requests are the same when method, address and body are. */
const fingerprintOf = ({ request }: AnyVisit) =>
  createHash('sha256')
    .update(JSON.stringify([request.method, request.originalUrl, request.body]))
    .digest('hex');

/**
 * Runs a handler at most once per Idempotency-Key and user, and answers the same again.
 * A request that failed did nothing, so its key is free again.
 * @throws Meaningless where the key was used for another request, Conflict while the first one still runs
 */
export async function answerOnce(visit: AnyVisit, route: Route): Promise<unknown> {
  const key = visit.request.get('idempotency-key');
  if (key === undefined || visit.user === null) return route.handler(visit);
  if (key.length === 0 || key.length > MAX_KEY_LENGTH)
    throw new Malformed([{ pointer: '#', detail: `An Idempotency-Key has 1 to ${MAX_KEY_LENGTH} characters.` }]);

  const { db } = visit.context;
  const claim = { userId: visit.user.id, key, fingerprint: fingerprintOf(visit) };
  const earlier = claimKey(db, claim);
  if (earlier) {
    if (earlier.fingerprint !== claim.fingerprint)
      throw new Meaningless([{ pointer: '#', detail: 'This Idempotency-Key was used for another request.' }]);
    if (earlier.status === null) throw new Conflict('The first request with this Idempotency-Key is still being worked on.');
    return answer(earlier.body === null ? undefined : JSON.parse(earlier.body), {
      status: earlier.status,
      etag: earlier.etag ?? undefined,
    });
  }
  try {
    const reply = await route.handler(visit);
    const { body, options } = reply instanceof Answer ? reply : new Answer(reply);
    keepAnswer(db, claim, {
      status: options.status ?? route.status,
      etag: options.etag ?? null,
      body: route.output === null ? null : JSON.stringify(body),
    });
    return reply;
  } catch (error) {
    forgetKey(db, claim);
    throw error;
  }
}
