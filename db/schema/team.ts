import { sql } from 'drizzle-orm';
import { check, index, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { user } from './account';
import { id, time } from './columns';

export const team = sqliteTable('team', { id: id(), name: text().notNull(), createdAt: time().notNull() });

export const teamMember = sqliteTable(
  'team_member',
  {
    teamId: text()
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    userId: text()
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    role: text({ enum: ['owner', 'member'] }).notNull(),
    createdAt: time().notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.teamId, table.userId] }),
    index('team_member_user').on(table.userId),
    check('team_member_role', sql`${table.role} in ('owner', 'member')`),
  ],
);
