import type { CaseResult, Check, Headline } from '@/contract';
import { quantities } from './quantities';
import { worstVerdict } from './worst-verdict';

interface Finding {
  readonly result: CaseResult;
  readonly check: Check;
}

const mostUnstable = (results: readonly CaseResult[]) =>
  results.reduce((worst, next) => (next.numbers.closedLoop.unstablePoles > worst.numbers.closedLoop.unstablePoles ? next : worst));

const highestMs = (results: readonly CaseResult[]) =>
  results.reduce((worst, next) => (next.numbers.sensitivity.ms.value > worst.numbers.sensitivity.ms.value ? next : worst));

/** A failure comes before any use: one whose limit and target fall together has none. */
const severity = ({ check }: Finding) => (check.use === null && check.verdict === 'fail' ? Infinity : (check.use ?? -Infinity));

function nearestLimit(results: readonly CaseResult[]): Finding | null {
  const findings = results.flatMap((result) =>
    result.checks.filter(({ quantity, value }) => quantities[quantity].stability && value !== null).map((check) => ({ result, check })),
  );
  if (findings.length === 0) return null;
  return findings.reduce((worst, next) => (severity(next) > severity(worst) ? next : worst));
}

const reasonOf = (results: readonly CaseResult[]) => results.find(({ verdict }) => verdict === 'notJudged')?.reason ?? null;

/**
 * The number that stands first: an unstable case before anything, then the stability quantity nearest its limit,
 * and without such a limit Ms. Its verdict is that of all cases together, whichever quantity it comes from.
 *
 * @param results the judged cases, at least one
 */
export function headline(results: readonly CaseResult[]): Headline {
  const verdict = worstVerdict(results.map((result) => result.verdict));
  const unstable = results.filter(({ numbers }) => !numbers.closedLoop.stable);
  const whole = {
    verdict,
    unstableCases: unstable.length,
    reason: verdict === 'notJudged' ? reasonOf(results) : null,
    limit: null,
    use: null,
  };
  if (unstable.length > 0) return { ...whole, quantity: 'ms', value: null, frequency: null, case: mostUnstable(unstable).case };

  const nearest = nearestLimit(results);
  if (nearest) {
    const { quantity, value, limit, use } = nearest.check;
    return {
      ...whole,
      quantity,
      value,
      limit,
      use,
      case: nearest.result.case,
      frequency: quantities[quantity].frequency(nearest.result.numbers),
    };
  }
  const worst = highestMs(results);
  const { value, frequency } = worst.numbers.sensitivity.ms;
  return { ...whole, quantity: 'ms', value, frequency, case: worst.case };
}
