import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { DesignContent } from '@/contract';
import { user } from './account';
import { id, json, time } from './columns';
import { project } from './project';

export const design = sqliteTable(
  'design',
  {
    id: id(),
    projectId: text()
      .notNull()
      .references(() => project.id, { onDelete: 'cascade' }),
    name: text().notNull(),
    latestRevision: integer().notNull(),
    createdAt: time().notNull(),
    updatedAt: time().notNull(),
  },
  (table) => [index('design_project').on(table.projectId)],
);

/** Never updated: a trigger refuses it. */
export const designRevision = sqliteTable(
  'design_revision',
  {
    designId: text()
      .notNull()
      .references(() => design.id, { onDelete: 'cascade' }),
    revision: integer().notNull(),
    content: json<DesignContent>().notNull(),
    note: text(),
    createdBy: text()
      .notNull()
      .references(() => user.id),
    createdAt: time().notNull(),
  },
  (table) => [primaryKey({ columns: [table.designId, table.revision] }), index('design_revision_author').on(table.createdBy)],
);
