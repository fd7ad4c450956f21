import type { Beside, CaseResult, Check, Verdict } from '@/contract';
import { quantities } from './quantities';

/** One check in one case. */
export interface Finding {
  readonly result: CaseResult;
  readonly check: Check;
}

export const findingsIn = (results: readonly CaseResult[]): Finding[] =>
  results.flatMap((result) => result.checks.map((check) => ({ result, check })));

export const isStability = ({ check }: Finding) => quantities[check.quantity].stability;

/** A failure comes before any use: one whose limit and target fall together has none. */
const severity = ({ check }: Finding) => (check.use === null && check.verdict === 'fail' ? Infinity : (check.use ?? -Infinity));

/**
 * The finding nearest its limit or furthest beyond it.
 * @param tie among equals the one with the least of this
 */
export function worstFinding(findings: readonly Finding[], tie: (finding: Finding) => number = () => 0): Finding | null {
  return findings.reduce<Finding | null>((worst, next) => {
    if (worst === null) return next;
    const more = severity(next) - severity(worst);
    return more > 0 || (severity(next) === severity(worst) && tie(next) < tie(worst)) ? next : worst;
  }, null);
}

function asBeside({ result, check }: Finding): Beside {
  const { quantity, value, limit, use, verdict } = check;
  return { quantity, value, limit, use, verdict, case: result.case, frequency: quantities[quantity].frequency(result.numbers) };
}

/**
 * What stands beside the headline: the performance quantity that failed worst; where none failed and the overall verdict is
 * not that of the headline's own check, the check that it comes from.
 */
export function besideHeadline(
  findings: readonly Finding[],
  { first, overall }: { first: Finding | null; overall: Verdict },
): Beside | null {
  const failed = worstFinding(findings.filter((finding) => finding.check.verdict === 'fail' && !isStability(finding)));
  if (failed) return asBeside(failed);
  if (first?.check.verdict === overall) return null;
  const source = worstFinding(findings.filter(({ check }) => check.verdict === overall));
  return source && asBeside(source);
}
