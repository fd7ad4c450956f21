import { eq } from 'drizzle-orm';
import type { Database } from '../open';
import { user } from '../tables';
import { transact } from '../transact';

type Row = typeof user.$inferSelect;
export interface UserChange {
  readonly name?: string;
  readonly preferences?: Row['preferences'];
}

/** @throws Error where there is no such user: ids come from sessions, which go with their user */
export function readUser(db: Database, id: string): Row {
  const row = db.select().from(user).where(eq(user.id, id)).get();
  if (!row) throw new Error(`There is no user ${id}.`);
  return row;
}

/** Writes a new name, and lays changed preferences over the kept ones. */
export function changeUser(db: Database, id: string, { name, preferences }: UserChange): Row {
  return transact(db, (within) => {
    const kept = readUser(within, id);
    const changed = { name: name ?? kept.name, preferences: { ...kept.preferences, ...preferences }, updatedAt: new Date() };
    within.update(user).set(changed).where(eq(user.id, id)).run();
    return { ...kept, ...changed };
  });
}
