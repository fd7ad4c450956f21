import type { CaseResult, Check, Verdict } from '@/contract';

/** One demand over all cases: where it is nearest its limit, and how every case stands to it. */
export interface WorstCheck {
  readonly check: Check;
  readonly case: CaseResult['case'];
  /** `use` of every case that has one. */
  readonly uses: readonly number[];
}

type Judged = Pick<CaseResult, 'case' | 'checks'>;

const severity: Readonly<Record<Verdict, number>> = { pass: 0, tight: 1, notJudged: 2, fail: 3 };
const NO_LIMIT = -Infinity;

function isWorse(check: Check, than: Check): boolean {
  const difference = severity[check.verdict] - severity[than.verdict];
  return difference !== 0 ? difference > 0 : (check.use ?? NO_LIMIT) > (than.use ?? NO_LIMIT);
}

/** What is demanded, in the order of the limits, each with the case that is nearest its limit. Every case has the same demands. */
export function worstChecks(results: readonly Judged[]): WorstCheck[] {
  const [first] = results;
  return (first?.checks ?? []).map((_, index) => {
    const worst = results.reduce((found, next) => (isWorse(next.checks[index], found.checks[index]) ? next : found));
    const uses = results.map(({ checks }) => checks[index].use).filter((use) => use !== null);
    return { check: worst.checks[index], case: worst.case, uses };
  });
}

/** Of more demands than there is room for those nearest their limits, in the order of the limits. */
export function mostPressing(checks: readonly WorstCheck[], most: number): WorstCheck[] {
  const nearest = [...checks].sort((a, b) => (isWorse(a.check, b.check) ? -1 : isWorse(b.check, a.check) ? 1 : 0)).slice(0, most);
  return checks.filter((check) => nearest.includes(check));
}
