import { eq, lte, sql } from 'drizzle-orm';
import type { Database } from '../open';
import { rateLimit } from '../tables';
import { transact } from '../transact';

type Row = typeof rateLimit.$inferSelect;

/** Adds one to the key's count, which starts anew when its window is over, and lets windows that are over go. */
export function countAttempt(db: Database, key: string, windowMs: number): Pick<Row, 'count' | 'windowEndsAt'> {
  const now = Date.now();
  return transact(db, (within) => {
    within
      .delete(rateLimit)
      .where(lte(rateLimit.windowEndsAt, new Date(now)))
      .run();
    return within
      .insert(rateLimit)
      .values({ key, count: 1, windowEndsAt: new Date(now + windowMs) })
      .onConflictDoUpdate({ target: rateLimit.key, set: { count: sql`${rateLimit.count} + 1` } })
      .returning()
      .get();
  });
}

export function takeBackAttempt(db: Database, key: string): void {
  db.update(rateLimit)
    .set({ count: sql`${rateLimit.count} - 1` })
    .where(eq(rateLimit.key, key))
    .run();
}
