import { randomUUID } from 'node:crypto';
import type { Client, Reply } from '../../../support/client';
import type { Operation } from './operations';
import type { Ids, Row } from './row';

/** A call that is right in all but what a test changes. */
export interface Attempt {
  readonly caller: Client;
  readonly ids: Ids;
  readonly body: unknown;
}

const address = (path: string, ids: Ids) =>
  path.replace('{revision}', '1').replace(/\{(\w+)\}/g, (_, name: string) => ids[name] ?? randomUUID());

export const attemptOf = (row: Row, caller: Client, ids: Ids): Attempt => ({ caller, ids, body: row.body?.(ids, caller) });

export const send = ({ method, path }: Operation, row: Row, { caller, ids, body }: Attempt): Promise<Reply<unknown>> =>
  caller.call(method, `${address(path, ids)}${row.query ?? ''}`, body, method === 'GET' ? {} : { 'if-match': '*' });

/** The body with another id wherever `field` stands; a list of ids becomes this one. */
export function withId(body: unknown, field: string, id: string): unknown {
  if (Array.isArray(body)) return body.map((item) => withId(item, field, id));
  if (typeof body !== 'object' || body === null) return body;
  const put = (value: unknown) => (Array.isArray(value) ? [id] : id);
  return Object.fromEntries(Object.entries(body).map(([key, value]) => [key, key === field ? put(value) : withId(value, field, id)]));
}

export const says = (body: unknown, field: string): boolean => JSON.stringify(body ?? null).includes(`"${field}":`);
