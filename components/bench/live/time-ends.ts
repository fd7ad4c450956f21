import type { Analysis } from '@/contract';
import { endOfResponse, wholeTimes } from '@/figures';

/** Where the time axes end, s: that of each response, and the one that a stack of both shares. */
export interface TimeEnds {
  readonly reference: number;
  readonly load: number;
  readonly both: number;
}

/**
 * Axes on which all of these loops are seen to settle, chosen from the times that the engine chose for each. An unstable loop, which
 * is shown until it has grown, counts only where no other is stable.
 */
export function timeEnds(analyses: readonly Analysis[]): TimeEnds {
  const stable = analyses.filter(({ closedLoop }) => closedLoop.stable);
  const counted = stable.length > 0 ? stable : analyses;
  const longest = (kind: 'reference' | 'load') => wholeTimes(Math.max(0, ...counted.map((analysis) => endOfResponse(analysis, kind))));
  const [reference, load] = [longest('reference'), longest('load')];
  return { reference, load, both: Math.max(reference, load) };
}
