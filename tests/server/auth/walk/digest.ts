import Connection from 'better-sqlite3';
import { join } from 'node:path';
import type { TestApp } from '../../../support/test-app';

/** Bookkeeping of requests; everything else is somebody's. */
const bookkeeping = ['rate_limit', 'idempotency_key', 'mail_message', '__drizzle_migrations'];

/** All that is kept, row by row, read from the file as it stands. */
export function digest({ context }: TestApp): string {
  const file = new Connection(join(context.config.dataDir, 'kerbline.sqlite'), { readonly: true });
  const tables = file.prepare<[], { name: string }>("select name from sqlite_schema where type = 'table' order by name").all();
  const rows = tables
    .filter(({ name }) => !bookkeeping.includes(name) && !name.startsWith('sqlite_'))
    .map(({ name }) => [name, file.prepare(`select * from "${name}" order by rowid`).all()]);
  file.close();
  return JSON.stringify(rows);
}
