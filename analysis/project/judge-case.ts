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

const unstatedOf = ({ sampling, deadTime }: Stated): string[] => [
  ...(sampling ? [] : ['Nobody stated the sample time.']),
  ...(deadTime ? [] : ['Nobody stated where the dead time comes from.']),
];

const uncomputed = (checks: readonly Check[]) =>
  `Could not be computed: ${checks
    .filter(({ verdict }) => verdict === 'notJudged')
    .map(({ quantity }) => quantity)
    .join(', ')}.`;

/** What holds in a loop that may not be the one in the car says nothing; what breaks there already is told. */
const unfounded = (check: Check): Check => (check.verdict === 'fail' ? check : { ...check, verdict: 'notJudged' });

/**
 * The verdict of one analysed case: not stable fails before anything; then what nobody stated or demanded leaves it and
 * whatever holds not judged, so that an unfounded number is never green and can be neither signed nor waived; then the worst of its checks.
 */
export function judgeCase(limits: readonly Limit[], analysis: Analysis, stated: Stated): Judgement {
  const checks = limits.map((limit) => judgeLimit(limit, analysis));
  if (!analysis.closedLoop.stable) return { verdict: 'fail', reason: null, checks };
  const unstated = unstatedOf(stated);
  const reasons = checks.length === 0 ? [...unstated, 'No limits are set.'] : unstated;
  if (reasons.length > 0) return { verdict: 'notJudged', reason: reasons.join(' '), checks: checks.map(unfounded) };
  const verdict = worstVerdict(checks.map((check) => check.verdict));
  return { verdict, reason: verdict === 'notJudged' ? uncomputed(checks) : null, checks };
}
