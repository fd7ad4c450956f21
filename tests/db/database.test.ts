import { randomUUID } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Worker } from 'node:worker_threads';
import Connection from 'better-sqlite3';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase, type OpenDatabase } from '@/db/open';
import { countAttempt, takeBackAttempt } from '@/db/stores/rate-limit-store';
import { transact } from '@/db/transact';
import { team, user } from '@/db/tables';

let folder: string;
let opened: OpenDatabase;
const file = () => join(folder, 'test.sqlite');
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'kerbline-db-'));
  opened = openDatabase(file());
});
afterEach(() => {
  opened.close();
  rmSync(folder, { recursive: true });
});

const newTeam = (name = 'Night shift') => ({ id: randomUUID(), name, createdAt: new Date(0) });
const raw = <T>(read: (connection: Connection.Database) => T): T => {
  const connection = new Connection(file());
  connection.pragma('foreign_keys = on');
  try {
    return read(connection);
  } finally {
    connection.close();
  }
};

describe('an opened database', () => {
  it('holds every pragma, again on the second open, and is migrated once', () => {
    opened.db.insert(team).values(newTeam()).run();
    opened.close();
    opened = openDatabase(file());
    expect(opened.wrongPragmas()).toEqual([]);
    expect(opened.db.select().from(team).all()).toMatchObject([{ name: 'Night shift', createdAt: new Date(0) }]);
  });

  it('says which pragma does not hold', () => {
    opened.db.run('pragma synchronous = normal');
    expect(opened.wrongPragmas()).toEqual(['synchronous']);
  });
});

describe('the tables', () => {
  const tables = () =>
    raw((connection) =>
      connection.prepare("select name, strict from pragma_table_list where schema = 'main' and type = 'table'").all(),
    ) as {
      name: string;
      strict: number;
    }[];
  const own = () => tables().filter(({ name }) => !name.startsWith('sqlite_') && !name.startsWith('__'));

  it('are all strict', () => {
    expect(own().length).toBeGreaterThan(15);
    expect(own().filter(({ strict }) => !strict)).toEqual([]);
  });

  it('have an index that begins with every foreign key', () => {
    const missing = raw((connection) =>
      own().flatMap(({ name }) => {
        const keys = connection.pragma(`foreign_key_list(${name})`) as { id: number; from: string; seq: number }[];
        const indexes = (connection.pragma(`index_list(${name})`) as { name: string }[]).map(({ name: index }) =>
          (connection.pragma(`index_info(${index})`) as { name: string }[]).map((column) => column.name),
        );
        return keys.filter(({ seq, from }) => seq === 0 && !indexes.some(([first]) => first === from)).map(({ from }) => `${name}.${from}`);
      }),
    );
    expect(missing).toEqual([]);
  });

  it.each([
    ["insert into team_member values ('t', 'u', 'captain', 0)", /CHECK constraint failed: team_member_role/],
    [
      "insert into project_member (project_id, user_id, role, created_at) values ('p', 'u', 'admin', 0)",
      /CHECK constraint failed: project_member_role/,
    ],
    ["insert into team values ('t', 'name', 'yesterday')", /cannot store TEXT value in INTEGER column/],
    ["insert into project (id, team_id, name, created_at, updated_at) values ('p', 'nobody', 'n', 0, 0)", /FOREIGN KEY/],
  ])('refuse %s', (statement, reason) => {
    expect(() => raw((connection) => connection.exec(statement))).toThrow(reason);
  });

  it.each(['plant_revision', 'design_revision', 'analysis'])('never change a row of %s', (table) => {
    const trigger = raw((connection) =>
      connection.prepare("select sql from sqlite_schema where type = 'trigger' and tbl_name = ?").get(table),
    ) as { sql: string };
    expect(trigger.sql).toMatch(/BEFORE UPDATE/);
  });

  it('refuse a change to a kept plant revision', () => {
    const now = new Date();
    opened.db.insert(user).values({ id: 'u', name: 'Ada', email: 'ada@team.example', createdAt: now, updatedAt: now }).run();
    const change = () =>
      raw((connection) =>
        connection.exec(`
          insert into team values ('t', 'n', 0);
          insert into project (id, team_id, name, created_at, updated_at) values ('p', 't', 'n', 0, 0);
          insert into plant values ('pl', 'p', 'n', 1, 0, 0);
          insert into plant_revision values ('pl', 1, '{}', null, 'u', 0);
          update plant_revision set note = 'better';`),
      );
    expect(change).toThrow('plant_revision is immutable');
  });
});

describe('a transaction', () => {
  it('leaves nothing behind where it throws', () => {
    const failing = () =>
      transact(opened.db, (within) => {
        within.insert(team).values(newTeam()).run();
        throw new Error('halfway');
      });
    expect(failing).toThrow('halfway');
    expect(opened.db.select().from(team).all()).toEqual([]);
  });

  it('waits for another writer instead of failing', async () => {
    const HELD_MS = 400;
    const writer = new Worker(
      `const { parentPort } = require('node:worker_threads');
       const db = require('better-sqlite3')(${JSON.stringify(file())});
       db.exec('begin immediate');
       parentPort.postMessage('holding');
       setTimeout(() => { db.exec("insert into team values ('other', 'Other', 0)"); db.exec('commit'); db.close(); }, ${HELD_MS});`,
      { eval: true },
    );
    await new Promise((resolve) => writer.once('message', resolve));
    const names = transact(opened.db, (within) => {
      const before = within.select().from(team).all();
      within.insert(team).values(newTeam('Ours')).run();
      return before.map(({ name }) => name);
    });
    expect(names).toEqual(['Other']);
    await writer.terminate();
  });
});

describe('counted attempts', () => {
  it('are counted across processes and restarts, until their window is over', async () => {
    countAttempt(opened.db, 'sign-in:a', 60_000);
    opened.close();
    opened = openDatabase(file());
    expect(countAttempt(opened.db, 'sign-in:a', 60_000).count).toBe(2);
    expect(countAttempt(opened.db, 'sign-in:b', 60_000).count).toBe(1);
    takeBackAttempt(opened.db, 'sign-in:a');
    expect(countAttempt(opened.db, 'sign-in:a', 60_000).count).toBe(2);
    countAttempt(opened.db, 'short', 30);
    await new Promise((resolve) => setTimeout(resolve, 60));
    expect(countAttempt(opened.db, 'short', 30).count).toBe(1);
  });
});
