import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { KeptPlant } from '@/contract';
import { user } from './account';
import { id, json, time } from './columns';
import { project } from './project';

export const plant = sqliteTable(
  'plant',
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
  (table) => [index('plant_project').on(table.projectId)],
);

/** Never updated: a trigger refuses it. */
export const plantRevision = sqliteTable(
  'plant_revision',
  {
    plantId: text()
      .notNull()
      .references(() => plant.id, { onDelete: 'cascade' }),
    revision: integer().notNull(),
    content: json<KeptPlant>().notNull(),
    note: text(),
    createdBy: text()
      .notNull()
      .references(() => user.id),
    createdAt: time().notNull(),
  },
  (table) => [primaryKey({ columns: [table.plantId, table.revision] }), index('plant_revision_author').on(table.createdBy)],
);
