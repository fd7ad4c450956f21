import { targetOf } from '@/analysis/project';
import type { Limit } from '@/contract';
import type { ReaderUnits } from '@/figures/quantity-text';
import { demandOf, type DemandRow, rowOf } from './demand-row';

const other = { ms: { quantity: 'modulusMargin', bound: 'min' }, modulusMargin: { quantity: 'ms', bound: 'max' } } as const;

/** What a demand can also be written as: Ms and the modulus margin are one number and its inverse. */
export const writtenOtherwise = ({ quantity }: Pick<Limit, 'quantity'>): Pick<Limit, 'quantity' | 'bound'> | null =>
  quantity === 'ms' || quantity === 'modulusMargin' ? other[quantity] : null;

/**
 * The same demand in the other writing. The target goes along even where it was the default, since the default of the other
 * writing is another demand; so no verdict changes.
 */
export function rewriteDemand(row: DemandRow, units: ReaderUnits): DemandRow {
  const into = writtenOtherwise(row);
  const demand = demandOf(row);
  if (into === null || demand === null) return row;
  const target = targetOf(demand);
  return rowOf({ ...demand, ...into, limit: 1 / demand.limit, target: target === null ? null : 1 / target }, units);
}
