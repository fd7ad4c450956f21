import { and, eq, isNull, lt, or } from 'drizzle-orm';
import type { Database } from '../open';
import { idempotencyKey } from '../tables';
import { transact } from '../transact';

type Row = typeof idempotencyKey.$inferSelect;
type Claim = Pick<Row, 'userId' | 'key' | 'fingerprint'>;

const KEPT_MS = 24 * 3600_000;
/** A request that has not ended by then died with its process. */
const ABANDONED_MS = 60_000;

const sameKey = ({ userId, key }: Claim) => and(eq(idempotencyKey.userId, userId), eq(idempotencyKey.key, key));

/** Takes a key, or answers what is kept under it: another claim, or an answer. Lets old keys go. */
export function claimKey(db: Database, claim: Claim): Row | null {
  const now = Date.now();
  return transact(db, (within) => {
    within
      .delete(idempotencyKey)
      .where(
        or(
          lt(idempotencyKey.createdAt, new Date(now - KEPT_MS)),
          and(isNull(idempotencyKey.status), lt(idempotencyKey.createdAt, new Date(now - ABANDONED_MS))),
        ),
      )
      .run();
    const kept = within.select().from(idempotencyKey).where(sameKey(claim)).get();
    if (kept) return kept;
    within
      .insert(idempotencyKey)
      .values({ ...claim, createdAt: new Date(now) })
      .run();
    return null;
  });
}

export function keepAnswer(db: Database, claim: Claim, kept: Pick<Row, 'status' | 'etag' | 'body'>): void {
  db.update(idempotencyKey).set(kept).where(sameKey(claim)).run();
}

export function forgetKey(db: Database, claim: Claim): void {
  db.delete(idempotencyKey).where(sameKey(claim)).run();
}
