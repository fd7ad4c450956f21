import type { Analysis, Check, Limit, Verdict } from '@/contract';
import { judgeLimit } from './judge-limit';
import { worstVerdict } from './worst-verdict';

/** What somebody vouched for; a delay or sample time that nobody stated cannot be judged. */
export interface Stated {
  readonly sampling: boolean;
  readonly deadTime: boolean;
}

export interface Judgement {
  readonly verdict: Verdict;
  /** Why it is not judged; null where it is. */
  readonly reason: string | null;
  readonly checks: Check[];
}

function whyNotJudged(checks: readonly Check[], stated: Stated): string[] {
  const reasons: string[] = [];
  if (!stated.sampling) reasons.push('Nobody stated the sample time.');
  if (!stated.deadTime) reasons.push('Nobody stated where the dead time comes from.');
  if (checks.length === 0) reasons.push('No limits are set.');
  return reasons;
}

const uncomputed = (checks: readonly Check[]) =>
  `Could not be computed: ${checks
    .filter(({ verdict }) => verdict === 'notJudged')
    .map(({ quantity }) => quantity)
    .join(', ')}.`;

/**
 * The verdict of one analysed case: not stable fails before anything; then what nobody stated or demanded leaves it
 * not judged, so that an unfounded number can be neither signed nor waived; then the worst of its checks.
 */
export function judgeCase(limits: readonly Limit[], analysis: Analysis, stated: Stated): Judgement {
  const checks = limits.map((limit) => judgeLimit(limit, analysis));
  if (!analysis.closedLoop.stable) return { verdict: 'fail', reason: null, checks };
  const reasons = whyNotJudged(checks, stated);
  if (reasons.length > 0) return { verdict: 'notJudged', reason: reasons.join(' '), checks };
  const verdict = worstVerdict(checks.map((check) => check.verdict));
  return { verdict, reason: verdict === 'notJudged' ? uncomputed(checks) : null, checks };
}
