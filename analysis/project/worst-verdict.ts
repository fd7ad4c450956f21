import type { Verdict } from '@/contract';

const fromWorst: readonly Verdict[] = ['fail', 'notJudged', 'tight', 'pass'];

/** The verdict that several make together: a failure first, then what could not be judged. Of none, nothing was judged. */
export function worstVerdict(verdicts: readonly Verdict[]): Verdict {
  return fromWorst.find((verdict) => verdicts.includes(verdict)) ?? 'notJudged';
}
