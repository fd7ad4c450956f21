import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { OperatingRange } from '@/contract';
import { user } from './account';
import { flag, id, json, time } from './columns';
import { team } from './team';

/** One loop on one vehicle. `version` counts edits and is the ETag. */
export const project = sqliteTable(
  'project',
  {
    id: id(),
    teamId: text()
      .notNull()
      .references(() => team.id),
    name: text().notNull(),
    vehicle: text().notNull().default(''),
    description: text().notNull().default(''),
    archived: flag().notNull().default(false),
    operatingRange: json<OperatingRange[]>().notNull().default([]),
    version: integer().notNull().default(1),
    createdAt: time().notNull(),
    updatedAt: time().notNull(),
  },
  (table) => [index('project_team').on(table.teamId)],
);

/** Someone's seat. `version` counts changes of role and is the ETag. */
export const projectMember = sqliteTable(
  'project_member',
  {
    projectId: text()
      .notNull()
      .references(() => project.id, { onDelete: 'cascade' }),
    userId: text()
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    role: text({ enum: ['owner', 'editor', 'reviewer', 'viewer'] }).notNull(),
    version: integer().notNull().default(1),
    createdAt: time().notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.projectId, table.userId] }),
    index('project_member_user').on(table.userId),
    check('project_member_role', sql`${table.role} in ('owner', 'editor', 'reviewer', 'viewer')`),
  ],
);

/** Who did what when, in words; the newest first on the project's home. */
export const activity = sqliteTable(
  'activity',
  {
    id: id(),
    projectId: text()
      .notNull()
      .references(() => project.id, { onDelete: 'cascade' }),
    userId: text()
      .notNull()
      .references(() => user.id),
    action: text().notNull(),
    summary: text().notNull(),
    detail: text(),
    createdAt: time().notNull(),
  },
  (table) => [index('activity_project').on(table.projectId, table.createdAt), index('activity_user').on(table.userId)],
);
