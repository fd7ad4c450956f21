import { parseNumber } from '@/components/ui/parse-number';
import type { Limit, Quantity } from '@/contract';
import type { ReaderUnits } from '@/figures/quantity-text';
import { demandDigits, demandUnit } from './demand-unit';

/** A number as it was typed, and what it means in the contract's unit; null where it is none. */
export interface TypedNumber {
  readonly text: string;
  readonly value: number | null;
}

/** One demand as it is edited. */
export interface DemandRow {
  readonly quantity: Quantity;
  readonly bound: Limit['bound'];
  readonly limit: TypedNumber;
  /** Empty: the default of the quantity, or none where it has none. */
  readonly target: TypedNumber;
  readonly source: string;
}

export const nothing: TypedNumber = { text: '', value: null };

type Named = Pick<Limit, 'quantity' | 'bound'>;

/** A quantity is demanded once with each bound, so both together name a demand. */
export const keyOf = ({ quantity, bound }: Named): string => `${quantity} ${bound}`;

export const emptyRow = ({ quantity, bound }: Named): DemandRow => ({ quantity, bound, limit: nothing, target: nothing, source: '' });

export function typed(text: string, quantity: Quantity, units: ReaderUnits): TypedNumber {
  const number = parseNumber(text);
  return { text, value: number === null ? null : demandUnit(quantity, units).kept(number) };
}

const shownAs = (value: number | null, quantity: Quantity, units: ReaderUnits): TypedNumber =>
  value === null ? nothing : { text: demandDigits(value, demandUnit(quantity, units)), value };

export const rowOf = ({ quantity, bound, limit, target, source }: Limit, units: ReaderUnits): DemandRow => ({
  quantity,
  bound,
  limit: shownAs(limit, quantity, units),
  target: shownAs(target, quantity, units),
  source,
});

export const rowsOf = (limits: readonly Limit[], units: ReaderUnits): DemandRow[] => limits.map((limit) => rowOf(limit, units));

/** The same rows for a reader who counts in other units. What is no number stays as it was typed. */
export function inUnits(rows: readonly DemandRow[], units: ReaderUnits): DemandRow[] {
  const again = (number: TypedNumber, quantity: Quantity) => (number.value === null ? number : shownAs(number.value, quantity, units));
  return rows.map((row) => ({ ...row, limit: again(row.limit, row.quantity), target: again(row.target, row.quantity) }));
}

/** What a row demands, where its limit is a number and its target is one or empty. */
export function demandOf({ quantity, bound, limit, target, source }: DemandRow): Limit | null {
  if (limit.value === null || (target.value === null && target.text.trim() !== '')) return null;
  return { quantity, bound, limit: limit.value, target: target.value, source: source.trim() };
}

export const sameDemand = (a: Limit | null, b: Limit | null): boolean =>
  a === b || (a !== null && b !== null && keyOf(a) === keyOf(b) && a.limit === b.limit && a.target === b.target && a.source === b.source);

/** Whether rows say just what these limits say, in any order. */
export const sayTheSame = (rows: readonly DemandRow[], limits: readonly Limit[]): boolean =>
  rows.length === limits.length &&
  rows.every((row) => sameDemand(demandOf(row), limits.find((limit) => keyOf(limit) === keyOf(row)) ?? null) && demandOf(row) !== null);
