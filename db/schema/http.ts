import { integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { user } from './account';
import { time } from './columns';

/** What a POST with an Idempotency-Key was answered. `status` is null while the first request still runs. */
export const idempotencyKey = sqliteTable(
  'idempotency_key',
  {
    userId: text()
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    key: text().notNull(),
    fingerprint: text().notNull(),
    status: integer(),
    etag: text(),
    body: text(),
    createdAt: time().notNull(),
  },
  (table) => [primaryKey({ columns: [table.userId, table.key] })],
);

/** Attempts of one kind by one caller within the current window. */
export const rateLimit = sqliteTable('rate_limit', {
  key: text().primaryKey(),
  count: integer().notNull(),
  windowEndsAt: time().notNull(),
});
