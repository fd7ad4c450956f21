import { sql } from 'drizzle-orm';
import { check, index, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core';
import { user } from './account';
import { id, time } from './columns';
import { project } from './project';

/** An address asked into a project that has no confirmed account yet; the row goes when it becomes a membership. The token is kept hashed. */
export const projectInvitation = sqliteTable(
  'project_invitation',
  {
    id: id(),
    projectId: text()
      .notNull()
      .references(() => project.id, { onDelete: 'cascade' }),
    email: text().notNull(),
    role: text({ enum: ['editor', 'reviewer', 'viewer'] }).notNull(),
    tokenHash: text().notNull().unique('project_invitation_token'),
    invitedBy: text()
      .notNull()
      .references(() => user.id),
    createdAt: time().notNull(),
    sentAt: time().notNull(),
    expiresAt: time().notNull(),
  },
  (table) => [
    unique('project_invitation_address').on(table.projectId, table.email),
    index('project_invitation_email').on(table.email),
    index('project_invitation_inviter').on(table.invitedBy),
    check('project_invitation_role', sql`${table.role} in ('editor', 'reviewer', 'viewer')`),
  ],
);
