import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Case } from '@/contract';
import { id, json, time } from './columns';
import { plant } from './plant';
import { project } from './project';

/** One condition the loop must survive. `case` is a word of SQL, hence the table's name; `plantRevision` null follows the latest. */
export const projectCase = sqliteTable(
  'project_case',
  {
    id: id(),
    projectId: text()
      .notNull()
      .references(() => project.id, { onDelete: 'cascade' }),
    plantId: text()
      .notNull()
      .references(() => plant.id, { onDelete: 'cascade' }),
    plantRevision: integer(),
    name: text().notNull(),
    parameters: json<Case['parameters']>().notNull().default({}),
    axes: json<Case['axes']>().notNull().default({}),
    basis: text({ enum: ['measured', 'figures', 'extrapolated'] })
      .notNull()
      .default('extrapolated'),
    position: integer().notNull(),
    version: integer().notNull().default(1),
    createdAt: time().notNull(),
    updatedAt: time().notNull(),
  },
  (table) => [
    index('project_case_project').on(table.projectId, table.position),
    index('project_case_plant').on(table.plantId),
    check('project_case_basis', sql`${table.basis} in ('measured', 'figures', 'extrapolated')`),
  ],
);
