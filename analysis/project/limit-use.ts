import type { Limit } from '@/contract';
import { targetOf } from './default-target';
import { judgedValue, quantities } from './quantities';

const UNMARKED_TARGET_INSIDE = 0.1;

/** Without a target, or with one that is the limit itself, the ruler is drawn as if it stood a tenth of the limit inside. */
function rulerTarget(demand: Limit): number {
  const { bound, limit } = demand;
  const target = targetOf(demand);
  if (target !== null && target !== limit) return target;
  const inside = UNMARKED_TARGET_INSIDE * Math.abs(limit);
  return bound === 'min' ? limit + inside : limit - inside;
}

/**
 * How much of the way from target to limit a value has used: 0 or less meets the target, 1 is the limit, more breaks it.
 * Limit, target and value are compared on the quantity's one scale.
 *
 * @returns null where limit and target fall together (a limit of 0 without a target), so that there is no ruler
 * @see numerics.md "Limits, targets, verdicts": use = (target − value)/(target − limit)
 * @example limitUse({ quantity: 'phaseMargin', bound: 'min', limit: 45, target: 50, source: '' }, 47.5) // 0.5
 */
export function limitUse(demand: Limit, value: number): number | null {
  const { scale } = quantities[demand.quantity];
  const target = scale(rulerTarget(demand));
  const use = (target - scale(judgedValue(demand.quantity, value))) / (target - scale(demand.limit));
  return Number.isFinite(use) ? use : null;
}
