import type { Analysis, Check, Limit, Verdict } from '@/contract';
import { limitUse } from './limit-use';
import { judgedValue, quantities } from './quantities';

const meets = ({ quantity, bound }: Limit, demanded: number, value: number) => {
  const judged = judgedValue(quantity, value);
  return bound === 'min' ? judged >= demanded : judged <= demanded;
};

function verdictOf(demand: Limit, value: number): Verdict {
  if (!meets(demand, demand.limit, value)) return 'fail';
  return demand.target === null || meets(demand, demand.target, value) ? 'pass' : 'tight';
}

/**
 * One demand laid against one analysed case.
 * In an unstable loop every check fails and has no use: its numbers have no meaning there.
 */
export function judgeLimit(demand: Limit, analysis: Analysis): Check {
  const { quantity, bound, limit, target } = demand;
  const reading = quantities[quantity];
  const value = reading.value(analysis);
  const check = { quantity, bound, limit, target, value, use: null };
  if (!analysis.closedLoop.stable) return { ...check, verdict: 'fail' };
  if (value === null) return { ...check, verdict: reading.nullIsUnlimited ? 'pass' : 'notJudged' };
  return { ...check, use: limitUse(demand, value), verdict: verdictOf(demand, value) };
}
