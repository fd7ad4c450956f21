import type { Limit, ProblemError } from '@/contract';
import { type CheckedRows, placeOf, type RowErrors } from './check-rows';
import { demandOf, type DemandRow, keyOf, sameDemand } from './demand-row';

interface Facts {
  readonly rows: readonly DemandRow[];
  readonly checked: CheckedRows;
  /** What the server had against what was sent to it. */
  readonly refused: { readonly errors: readonly ProblemError[]; readonly sent: readonly Limit[] };
  /** Somebody tried to keep it: what is missing is wrong too. */
  readonly asked: boolean;
}

/** What has to be seen at a row now: what the page finds wrong, and what the server refused of it as long as it says the same. */
export function rowErrors({ rows, checked, refused, asked }: Facts): (row: DemandRow) => RowErrors {
  const byKey = new Map<string, RowErrors>();
  for (const { pointer, detail } of refused.errors) {
    const place = placeOf(pointer);
    const sent = place ? refused.sent[place.row] : undefined;
    const row = sent && rows.find((other) => keyOf(other) === keyOf(sent));
    if (place && sent && row && sameDemand(demandOf(row), sent)) byKey.set(keyOf(row), { ...byKey.get(keyOf(row)), [place.field]: detail });
  }
  rows.forEach((row, index) => {
    const { limit, target } = checked.errors[index];
    const due = { ...(limit && (asked || row.limit.text !== '') && { limit }), ...(target && { target }) };
    byKey.set(keyOf(row), { ...byKey.get(keyOf(row)), ...due });
  });
  return (row) => byKey.get(keyOf(row)) ?? {};
}
