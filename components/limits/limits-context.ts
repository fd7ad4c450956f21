import { createContext, useContext } from 'react';
import type { WorstCheck } from '@/components/verdict/worst-checks';
import type { Quantity } from '@/contract';
import type { RowErrors } from './model/check-rows';
import type { DemandRow } from './model/demand-row';

/** What the rows of the limits share. */
export interface LimitsTable {
  readonly mayEdit: boolean;
  /** "rev 7"; null until something was analysed. */
  readonly revision: string | null;
  readonly standingOf: (row: DemandRow) => WorstCheck | undefined;
  /** What is wrong with a row and has to be seen now. */
  readonly errorsOf: (row: DemandRow) => RowErrors;
  /** The row that was added last: its limit has the focus. */
  readonly fresh: string | null;
  readonly change: (row: DemandRow, field: 'limit' | 'target' | 'source') => void;
  /** As what else a row can be written, where that is not demanded already. */
  readonly otherwiseOf: (row: DemandRow) => Quantity | null;
  readonly rewrite: (row: DemandRow) => void;
  readonly takeOut: (row: DemandRow) => void;
  readonly keep: () => void;
}

export const LimitsTableContext = createContext<LimitsTable | null>(null);

export function useLimitsTable(): LimitsTable {
  const table = useContext(LimitsTableContext);
  if (!table) throw new Error('This row stands in the table of limits.');
  return table;
}
