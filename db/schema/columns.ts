import { integer, text } from 'drizzle-orm/sqlite-core';

/** Column kinds that every table shares. Ids are UUIDs made by the app; times are whole milliseconds since 1970 in UTC. */
export const id = () => text().primaryKey();
export const time = () => integer({ mode: 'timestamp_ms' });
export const flag = () => integer({ mode: 'boolean' });
/** A value of one contract type, kept as JSON text. */
export const json = <T>() => text({ mode: 'json' }).$type<T>();
