import type { Limit } from '@/contract';
import type { ReaderUnits } from '@/figures/quantity-text';
import { demandOf, type DemandRow, keyOf, rowOf, sameDemand } from './demand-row';

/** One demand on which two people's limits part. */
export interface Difference {
  readonly key: string;
  readonly yours: DemandRow | null;
  readonly theirs: Limit | null;
  readonly changedBy: 'you' | 'them' | 'both';
}

const limitIn = (limits: readonly Limit[], key: string): Limit | null => limits.find((limit) => keyOf(limit) === key) ?? null;
const rowIn = (rows: readonly DemandRow[], key: string): DemandRow | null => rows.find((row) => keyOf(row) === key) ?? null;

/** A row that says nothing yet differs from everything, so that it is never lost. */
const isSame = (row: DemandRow | null, limit: Limit | null): boolean =>
  row === null ? limit === null : limit !== null && sameDemand(demandOf(row), limit);

/**
 * What both began from, what you have typed since, and what someone else has kept since, laid beside each other: every demand
 * that is not the same in yours and in theirs.
 */
export function differences(base: readonly Limit[], rows: readonly DemandRow[], theirs: readonly Limit[]): Difference[] {
  const keys = [...new Set([...rows, ...theirs].map(keyOf))];
  return keys.flatMap((key) => {
    const [yours, other, before] = [rowIn(rows, key), limitIn(theirs, key), limitIn(base, key)];
    if (isSame(yours, other)) return [];
    const mine = !isSame(yours, before);
    const changedBy = mine ? (sameDemand(other, before) ? 'you' : 'both') : 'them';
    return [{ key, yours, theirs: other, changedBy }];
  });
}

interface Meeting {
  readonly base: readonly Limit[];
  readonly rows: readonly DemandRow[];
  readonly theirs: readonly Limit[];
}

/** Yours on top of theirs: what you changed stands as you have it, everything else as they have it. */
export function onTopOf({ base, rows, theirs }: Meeting, units: ReaderUnits): DemandRow[] {
  const changedByYou = (key: string) => !isSame(rowIn(rows, key), limitIn(base, key));
  const kept = theirs.flatMap((limit) => {
    const key = keyOf(limit);
    return changedByYou(key) ? (rowIn(rows, key) ?? []) : rowOf(limit, units);
  });
  const added = rows.filter((row) => limitIn(theirs, keyOf(row)) === null && changedByYou(keyOf(row)));
  return [...kept, ...added];
}

/** One demand as they have it, the others as you have them. */
export function takingTheirs(rows: readonly DemandRow[], { key, yours, theirs }: Difference, units: ReaderUnits): DemandRow[] {
  if (theirs === null) return rows.filter((row) => keyOf(row) !== key);
  const taken = rowOf(theirs, units);
  return yours === null ? [...rows, taken] : rows.map((row) => (keyOf(row) === key ? taken : row));
}
