import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Limit } from '@/contract';
import { user } from './account';
import { json, time } from './columns';
import { project } from './project';

/** What a project demands, all of it in one row: the limits are edited, and judged against, as one. */
export const projectLimits = sqliteTable(
  'project_limits',
  {
    projectId: text()
      .primaryKey()
      .references(() => project.id, { onDelete: 'cascade' }),
    items: json<Limit[]>().notNull(),
    version: integer().notNull(),
    updatedBy: text()
      .notNull()
      .references(() => user.id),
    updatedAt: time().notNull(),
  },
  (table) => [index('project_limits_author').on(table.updatedBy)],
);
