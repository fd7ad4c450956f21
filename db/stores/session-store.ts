import { and, desc, eq, gt, ne } from 'drizzle-orm';
import type { Database } from '../open';
import { session } from '../tables';

/** Someone's sessions that are not over, the last used first. */
export function sessionsOf(db: Database, userId: string): (typeof session.$inferSelect)[] {
  return db
    .select()
    .from(session)
    .where(and(eq(session.userId, userId), gt(session.expiresAt, new Date())))
    .orderBy(desc(session.updatedAt))
    .all();
}

/** Ends one session of this user; false where it is not theirs or not there. */
export function endSession(db: Database, userId: string, sessionId: string): boolean {
  return (
    db
      .delete(session)
      .where(and(eq(session.userId, userId), eq(session.id, sessionId)))
      .run().changes > 0
  );
}

/** Ends every session of this user but one. */
export function endOtherSessions(db: Database, userId: string, keptSessionId: string): void {
  db.delete(session)
    .where(and(eq(session.userId, userId), ne(session.id, keptSessionId)))
    .run();
}
