import type { Quantity } from './common';
import { isInRange, quantityRules, type Bound } from './quantity-rules';

interface Demand {
  readonly quantity: Quantity;
  readonly bound: Bound;
  readonly limit: number;
  readonly target: number | null;
}

export interface LimitIssue {
  /** Into the list of demands. */
  readonly path: readonly [number, 'quantity' | 'bound' | 'limit' | 'target'];
  readonly message: string;
}

const words = { min: 'at least', max: 'at most' };

/** How a number of a quantity is said; as the contract has it unless told otherwise. */
type Say = (quantity: Quantity, value: number) => string;

function ownIssues({ quantity, bound, limit, target }: Demand, index: number, say: Say): LimitIssue[] {
  const { bounds, range } = quantityRules[quantity];
  if (!bounds.includes(bound)) return [{ path: [index, 'bound'], message: `This quantity is demanded as “${words[bounds[0]]}”.` }];
  const issues: LimitIssue[] = [];
  if (!isInRange(quantity, limit)) issues.push({ path: [index, 'limit'], message: `The limit of this quantity is ${range}.` });
  if (target === null) return issues;
  const outside = bound === 'min' ? target < limit : target > limit;
  if (outside)
    issues.push({
      path: [index, 'target'],
      message: `A target lies inside its limit: ${bound === 'min' ? 'no less' : 'no more'} than ${say(quantity, limit)}.`,
    });
  else if (!isInRange(quantity, target)) issues.push({ path: [index, 'target'], message: `The target of this quantity is ${range}.` });
  return issues;
}

/**
 * What is wrong with a list of demands: a bound without sense, a number out of range, a target outside its limit, a quantity
 * demanded twice, a least value above the greatest. `say` words numbers in a reader's units.
 */
export function limitIssues(demands: readonly Demand[], say: Say = (_, value) => String(value)): LimitIssue[] {
  return demands.flatMap((demand, index) => {
    const before = demands.slice(0, index).filter(({ quantity }) => quantity === demand.quantity);
    const issues = ownIssues(demand, index, say);
    if (before.some(({ bound }) => bound === demand.bound))
      issues.push({ path: [index, 'quantity'], message: `This quantity is demanded as “${words[demand.bound]}” already.` });
    const other = before.find(({ bound }) => bound !== demand.bound);
    const [least, most] = demand.bound === 'min' ? [demand.limit, other?.limit] : [other?.limit, demand.limit];
    if (least !== undefined && most !== undefined && least > most)
      issues.push({
        path: [index, 'limit'],
        message: `At least ${say(demand.quantity, least)} and at most ${say(demand.quantity, most)} cannot both hold.`,
      });
    return issues;
  });
}
