import type { Analysis, Check, Limit, Verdict } from '@/contract';
import { targetOf } from './default-target';
import { limitUse } from './limit-use';
import { judgedValue, quantities } from './quantities';

/**
 * Compared on the quantity's one scale and nowhere else, so that a demand on Ms and the same one on the modulus margin agree
 * to the last digit. A scale that turns the order round (1/value) turns "at most" into "at least".
 */
function meets({ quantity, bound }: Limit, demanded: number, value: number): boolean {
  const { scale, turnsOrder } = quantities[quantity];
  const [judged, wanted] = [scale(judgedValue(quantity, value)), scale(demanded)];
  return (bound === 'min') === turnsOrder ? judged <= wanted : judged >= wanted;
}

function verdictOf(demand: Limit, target: number | null, value: number): Verdict {
  if (!meets(demand, demand.limit, value)) return 'fail';
  return target === null || meets(demand, target, value) ? 'pass' : 'tight';
}

/**
 * One demand laid against one analysed case.
 * In an unstable loop every check fails and has no use: its numbers have no meaning there.
 */
export function judgeLimit(demand: Limit, analysis: Analysis): Check {
  const { quantity, bound, limit } = demand;
  const target = targetOf(demand);
  const reading = quantities[quantity];
  const value = reading.value(analysis);
  const check = { quantity, bound, limit, target, value, use: null };
  if (!analysis.closedLoop.stable) return { ...check, verdict: 'fail' };
  if (value === null) return { ...check, verdict: reading.nullIsUnlimited ? 'pass' : 'notJudged' };
  return { ...check, use: limitUse(demand, value), verdict: verdictOf(demand, target, value) };
}
