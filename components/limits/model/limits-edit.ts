import type { Limit } from '@/contract';
import type { ReadLimits } from '@/hooks/queries/limits';
import type { ReaderUnits } from '@/figures/quantity-text';
import { type DemandRow, inUnits, rowsOf, sayTheSame } from './demand-row';

/** The version of the limits that was read. */
export interface Base {
  readonly etag: string | null;
  readonly items: readonly Limit[];
}

/** Limits as they are edited: what was begun from, what is typed, in which units, and how to take it back. */
export interface LimitsEdit {
  readonly base: Base;
  readonly rows: readonly DemandRow[];
  readonly units: ReaderUnits;
  readonly past: readonly (readonly DemandRow[])[];
  /** Which field the last change typed in: going on there is the same change. */
  readonly typing: string | null;
}

const MOST_STEPS = 50;

export const baseOf = ({ etag, items }: ReadLimits): Base => ({ etag, items });

export const beginEdit = (base: Base, { frequency, magnitude }: ReaderUnits): LimitsEdit => {
  const units = { frequency, magnitude };
  return { base, rows: rowsOf(base.items, units), units, past: [], typing: null };
};

/** Other rows, which can be taken back; `typing` names the field where they were typed. */
export const changeRows = (edit: LimitsEdit, rows: readonly DemandRow[], typing: string | null = null): LimitsEdit => ({
  ...edit,
  rows,
  typing,
  past: typing !== null && typing === edit.typing ? edit.past : [...edit.past, edit.rows].slice(-MOST_STEPS),
});

export function undo(edit: LimitsEdit): LimitsEdit {
  const rows = edit.past[edit.past.length - 1];
  return rows === undefined ? edit : { ...edit, rows, past: edit.past.slice(0, -1), typing: null };
}

export const isChanged = ({ rows, base }: LimitsEdit): boolean => !sayTheSame(rows, base.items);

const sameUnits = (a: ReaderUnits, b: ReaderUnits) => a.frequency === b.frequency && a.magnitude === b.magnitude;

/** The edit for a reader who counts in these units now. */
export const editIn = (edit: LimitsEdit, { frequency, magnitude }: ReaderUnits): LimitsEdit => {
  const units = { frequency, magnitude };
  if (sameUnits(edit.units, units)) return edit;
  return { ...edit, units, rows: inUnits(edit.rows, units), past: edit.past.map((rows) => inUnits(rows, units)) };
};

/**
 * The edit beside what is kept now. Where nothing was typed, or just the same was kept, it follows; otherwise it stays as it is,
 * on the version that it was begun from.
 */
export function meetKept(edit: LimitsEdit, kept: Base): LimitsEdit {
  if (edit.base.etag === kept.etag) return edit;
  return !isChanged(edit) || sayTheSame(edit.rows, kept.items) ? { ...beginEdit(kept, edit.units), past: [] } : edit;
}
