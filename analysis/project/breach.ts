import type { Analysis, Check, Limit, Loop } from '@/contract';
import { analyseLoop, withResponses } from '@/analysis/analyse-loop';
import { LoopError } from '@/analysis/loop/loop-error';
import type { Detail } from '@/analysis/margins/search-grid';
import { judgeLimit } from './judge-limit';
import { quantities } from './quantities';

/** What does not hold; no quantity where the loop itself is no longer stable. */
export interface Breach {
  readonly quantity: Limit['quantity'] | null;
  readonly limit: number | null;
}

const notStable: Breach = { quantity: null, limit: null };

const useOf = ({ use }: Check) => use ?? Infinity;

/** The limit that an analysed loop breaks worst, or its stability; null where everything that can be judged holds. */
export function breachIn(limits: readonly Limit[], analysis: Analysis): Breach | null {
  if (!analysis.closedLoop.stable) return notStable;
  const broken = limits.map((limit) => judgeLimit(limit, analysis)).filter(({ verdict }) => verdict === 'fail');
  if (broken.length === 0) return null;
  const { quantity, limit } = broken.reduce((worst, next) => (useOf(next) > useOf(worst) ? next : worst));
  return { quantity, limit };
}

/** Whether a demand is judged on a time response, the dearest part of an analysis. */
export const needsResponses = (limits: readonly Limit[]) => limits.some(({ quantity }) => quantities[quantity].fromResponse);

/**
 * As breachIn, of a loop that is analysed no further than needed: a time response only where everything else holds.
 * What the engine refuses does not hold.
 */
export function breachOf(loop: Loop, limits: readonly Limit[], detail: Detail = 'full'): Breach | null {
  const timed = limits.filter(({ quantity }) => quantities[quantity].fromResponse);
  const untimed = limits.filter((limit) => !timed.includes(limit));
  try {
    const analysis = analyseLoop(loop, { curves: false, responses: false, detail });
    const breach = breachIn(untimed, analysis);
    return breach || timed.length === 0 ? breach : breachIn(timed, withResponses(analysis, loop, 'live'));
  } catch (error) {
    if (error instanceof LoopError) return notStable;
    throw error;
  }
}
