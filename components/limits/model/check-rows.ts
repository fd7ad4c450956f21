import { defaultTarget } from '@/analysis/project';
import { isInRange, type Limit, limitIssues, type Quantity, quantityRules } from '@/contract';
import { withUnit } from '@/figures';
import type { ReaderUnits } from '@/figures/quantity-text';
import { demandOf, type DemandRow } from './demand-row';
import { demandDigits, demandUnit } from './demand-unit';

export interface RowErrors {
  limit?: string;
  target?: string;
}

export interface CheckedRows {
  /** The limits that the rows say; null where some row says none, or they cannot stand together. */
  readonly limits: Limit[] | null;
  /** What is wrong, row by row. */
  readonly errors: readonly RowErrors[];
}

function unread({ limit, target }: DemandRow): RowErrors {
  const errors: RowErrors = {};
  if (limit.text.trim() === '') errors.limit = 'A limit is needed here, or the row goes.';
  else if (limit.value === null) errors.limit = 'A number, as in 0.35.';
  if (target.value === null && target.text.trim() !== '') errors.target = 'A number, or nothing.';
  return errors;
}

function emptyTargetIssue(demand: Limit, say: (quantity: Quantity, value: number) => string): string | null {
  const target = demand.target === null ? defaultTarget(demand) : null;
  if (target === null || isInRange(demand.quantity, target)) return null;
  return `Left empty, the target would be ${say(demand.quantity, target)}, and this quantity is ${quantityRules[demand.quantity].range}: name one.`;
}

/** Reads rows as limits, and says at each field what is wrong with it, in the reader's units. */
export function checkRows(rows: readonly DemandRow[], units: ReaderUnits): CheckedRows {
  const say = (quantity: Quantity, value: number) => {
    const unit = demandUnit(quantity, units);
    return withUnit(demandDigits(value, unit), unit.name);
  };
  const errors = rows.map(unread);
  const read = rows.flatMap((row, index) => {
    const demand = demandOf(row);
    return demand ? [{ demand, index }] : [];
  });
  const demands = read.map(({ demand }) => demand);
  for (const { path, message } of limitIssues(demands, say)) {
    const [at, field] = path;
    errors[read[at].index][field === 'target' ? 'target' : 'limit'] ??= message;
  }
  for (const { demand, index } of read) {
    const issue = emptyTargetIssue(demand, say);
    if (issue && !errors[index].limit) errors[index].target ??= issue;
  }
  const sound = errors.every(({ limit, target }) => !limit && !target);
  return { limits: sound ? demands : null, errors };
}

/** Where a JSON Pointer of the server's answer leads: a row and its field. */
export function placeOf(pointer: string): { row: number; field: keyof RowErrors } | null {
  const [, row, field] = /^\/items\/(\d+)(?:\/(\w+))?/.exec(pointer) ?? [];
  return row === undefined ? null : { row: Number(row), field: field === 'target' ? 'target' : 'limit' };
}
