import { randomUUID } from 'node:crypto';
import { desc, eq } from 'drizzle-orm';
import type { Database } from '../open';
import { mailMessage } from '../tables';

type Kept = typeof mailMessage.$inferSelect;

export function keepMessage(db: Database, message: Omit<Kept, 'id' | 'createdAt'>): void {
  db.insert(mailMessage)
    .values({ ...message, id: randomUUID(), createdAt: new Date() })
    .run();
}

/** The newest messages to one address, or to all. */
export function listMessages(db: Database, to: string | undefined, limit: number): Kept[] {
  const rows = db.select().from(mailMessage);
  return (to === undefined ? rows : rows.where(eq(mailMessage.to, to))).orderBy(desc(mailMessage.createdAt)).limit(limit).all();
}
