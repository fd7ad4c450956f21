import Connection, { type RunResult } from 'better-sqlite3';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import type { BaseSQLiteDatabase } from 'drizzle-orm/sqlite-core';
import { migrationsFolder } from './migrations-folder';
import * as tables from './tables';

/** What stores run their statements on: the database itself, or a transaction in it. */
export type Database = BaseSQLiteDatabase<'sync', RunResult, typeof tables>;

export interface OpenDatabase {
  readonly db: Database;
  /** Names of the pragmas that do not hold what they must; empty in a healthy database. */
  readonly wrongPragmas: () => string[];
  readonly close: () => void;
}

/**
 * FULL, because better-sqlite3 reopens a WAL database in NORMAL, which can lose acknowledged commits at a power cut;
 * trusted_schema off, because a database file may be handed around.
 */
const pragmas = { journal_mode: 'wal', synchronous: 2, busy_timeout: 5000, foreign_keys: 1, trusted_schema: 0 } as const;

/** Opens the SQLite file, sets what every connection needs, and brings the tables up to date. */
export function openDatabase(file: string): OpenDatabase {
  const connection = new Connection(file);
  for (const [name, value] of Object.entries(pragmas)) connection.pragma(`${name} = ${value}`);
  const db = drizzle(connection, { schema: tables, casing: 'snake_case' });
  migrate(db, { migrationsFolder: migrationsFolder() });
  return {
    db,
    wrongPragmas: () =>
      Object.entries(pragmas)
        .filter(([name, value]) => connection.pragma(name, { simple: true }) !== value)
        .map(([name]) => name),
    close: () => connection.close(),
  };
}
