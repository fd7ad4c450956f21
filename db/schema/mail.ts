import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { id, json, time } from './columns';

/** Messages of the local mail fake, kept where no SMTP server is named. */
export const mailMessage = sqliteTable(
  'mail_message',
  {
    id: id(),
    to: text().notNull(),
    subject: text().notNull(),
    text: text().notNull(),
    html: text().notNull(),
    links: json<string[]>().notNull(),
    createdAt: time().notNull(),
  },
  (table) => [index('mail_message_to').on(table.to, table.createdAt)],
);
