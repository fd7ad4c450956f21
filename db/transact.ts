import type { Database } from './open';

/**
 * Runs `work` in one transaction that takes the write lock at once. Deferred, SQLite's default, would fail with
 * SQLITE_BUSY without waiting as soon as two transactions that began by reading want to write.
 */
export function transact<T>(db: Database, work: (within: Database) => T): T {
  return db.transaction(work, { behavior: 'immediate' });
}
