import { attempt } from '../auth/limits';
import type { Context } from '../context';

const MINUTE_MS = 60_000;

/** Counts one call of the engine by someone. @throws TooMany past `analysePerMinute` */
export function countAnalysis({ config, db }: Pick<Context, 'config' | 'db'>, user: { readonly id: string }): void {
  attempt(db, { name: 'analyse', most: config.analysePerMinute, windowMs: MINUTE_MS }, user.id);
}
