import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { CaseResult, FrozenInputs, Headline, Room } from '@/contract';
import { user } from './account';
import { id, json, time } from './columns';
import { designRevision } from './design';
import { project } from './project';

/** A frozen result with everything it was computed from. Never updated: a trigger refuses it. */
export const analysis = sqliteTable(
  'analysis',
  {
    id: id(),
    projectId: text()
      .notNull()
      .references(() => project.id, { onDelete: 'cascade' }),
    designId: text().notNull(),
    designRevision: integer().notNull(),
    engineVersion: text().notNull(),
    contentHash: text().notNull(),
    resultHash: text().notNull(),
    verdict: text({ enum: ['pass', 'tight', 'fail', 'notJudged'] }).notNull(),
    headline: json<Headline>().notNull(),
    room: json<Room>(),
    inputs: json<FrozenInputs>().notNull(),
    results: json<CaseResult[]>().notNull(),
    createdBy: text()
      .notNull()
      .references(() => user.id),
    createdAt: time().notNull(),
  },
  (table) => [
    foreignKey({
      columns: [table.designId, table.designRevision],
      foreignColumns: [designRevision.designId, designRevision.revision],
    }).onDelete('cascade'),
    index('analysis_project').on(table.projectId, table.createdAt),
    index('analysis_design').on(table.designId, table.designRevision),
    index('analysis_author').on(table.createdBy),
    check('analysis_verdict', sql`${table.verdict} in ('pass', 'tight', 'fail', 'notJudged')`),
  ],
);
