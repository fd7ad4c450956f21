import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Preferences } from '@/contract';
import { flag, id, json, time } from './columns';

/** The tables of better-auth, under its model names, with the reader's preferences beside the user. */

export const user = sqliteTable('user', {
  id: id(),
  name: text().notNull(),
  email: text().notNull().unique(),
  emailVerified: flag().notNull().default(false),
  image: text(),
  preferences: json<Partial<Preferences>>().notNull().default({}),
  createdAt: time().notNull(),
  updatedAt: time().notNull(),
});

const userId = () =>
  text()
    .notNull()
    .references(() => user.id, { onDelete: 'cascade' });

export const session = sqliteTable(
  'session',
  {
    id: id(),
    userId: userId(),
    token: text().notNull().unique(),
    expiresAt: time().notNull(),
    ipAddress: text(),
    userAgent: text(),
    createdAt: time().notNull(),
    updatedAt: time().notNull(),
  },
  (table) => [index('session_user').on(table.userId)],
);

export const account = sqliteTable(
  'account',
  {
    id: id(),
    userId: userId(),
    accountId: text().notNull(),
    providerId: text().notNull(),
    password: text(),
    accessToken: text(),
    refreshToken: text(),
    idToken: text(),
    accessTokenExpiresAt: time(),
    refreshTokenExpiresAt: time(),
    scope: text(),
    createdAt: time().notNull(),
    updatedAt: time().notNull(),
  },
  (table) => [index('account_user').on(table.userId)],
);

export const verification = sqliteTable(
  'verification',
  {
    id: id(),
    identifier: text().notNull(),
    value: text().notNull(),
    expiresAt: time().notNull(),
    createdAt: time().notNull(),
    updatedAt: time().notNull(),
  },
  (table) => [index('verification_identifier').on(table.identifier)],
);
