import { and, eq, gt, lt, or, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';
import type { PageQuery } from '@/contract';

/** Lists are cut by the sort key and id of the last item, so that what is added meanwhile moves no page. */

export interface Page<Item> {
  readonly items: Item[];
  readonly nextCursor: string | null;
}

/** One row more than is shown tells whether another page follows. */
export const rowsFor = ({ limit }: PageQuery) => limit + 1;

/** @param keyOf the sort key (a whole number or a time) and id of a row */
export function toPage<Row, Item>(
  rows: readonly Row[],
  { limit }: PageQuery,
  { keyOf, item }: { keyOf: (row: Row) => [number | Date, string]; item: (row: Row) => Item },
): Page<Item> {
  const shown = rows.slice(0, limit);
  if (rows.length <= limit) return { items: shown.map(item), nextCursor: null };
  const [key, id] = keyOf(shown[shown.length - 1]);
  return { items: shown.map(item), nextCursor: `${Number(key)}_${id}` };
}

function split(cursor: string): { key: number; id: string } {
  const [key, id] = cursor.split('_');
  return { key: Number(key), id };
}

/** Rows after the cursor in a list that is sorted by time and id, newest first. */
export function before(time: SQLiteColumn, id: SQLiteColumn, { cursor }: PageQuery): SQL | undefined {
  if (cursor === undefined) return undefined;
  const last = split(cursor);
  const at = new Date(last.key);
  return or(lt(time, at), and(eq(time, at), lt(id, last.id)));
}

/** Rows after the cursor in a list that is sorted by time and id, oldest first. */
export function after(time: SQLiteColumn, id: SQLiteColumn, { cursor }: PageQuery): SQL | undefined {
  if (cursor === undefined) return undefined;
  const last = split(cursor);
  const at = new Date(last.key);
  return or(gt(time, at), and(eq(time, at), gt(id, last.id)));
}

/** Rows after the cursor in a list that is sorted by a whole number, upwards. */
export const beyond = (column: SQLiteColumn, { cursor }: PageQuery) => (cursor === undefined ? undefined : gt(column, split(cursor).key));

/** Rows after the cursor in a list that is sorted by a whole number, downwards. */
export const below = (column: SQLiteColumn, { cursor }: PageQuery) => (cursor === undefined ? undefined : lt(column, split(cursor).key));
