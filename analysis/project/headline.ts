import type { CaseResult, Headline, Verdict } from '@/contract';
import { edgesOf, openEdges, type Checked } from './edges';
import { besideHeadline, findingsIn, isStability, worstFinding, type Finding } from './findings';
import { quantities } from './quantities';
import { worstVerdict } from './worst-verdict';

type Number = Pick<Headline, 'quantity' | 'value' | 'frequency' | 'limit' | 'target' | 'use'> & { case: CaseResult['case'] };

const undemanded = { limit: null, target: null, use: null };

const mostUnstable = (results: readonly CaseResult[]) =>
  results.reduce((worst, next) => (next.numbers.closedLoop.unstablePoles > worst.numbers.closedLoop.unstablePoles ? next : worst));

function highestMs(results: readonly CaseResult[]): Number {
  const worst = results.reduce((highest, next) =>
    next.numbers.sensitivity.ms.value > highest.numbers.sensitivity.ms.value ? next : highest,
  );
  const { value, frequency } = worst.numbers.sensitivity.ms;
  return { ...undemanded, quantity: 'ms', value, frequency, case: worst.case };
}

function numberOf({ result, check }: Finding): Number {
  const { quantity, value, limit, target, use } = check;
  return { quantity, value, limit, target, use, case: result.case, frequency: quantities[quantity].frequency(result.numbers) };
}

/** What was not checked cannot be vouched for: a pass at an end that is not the end of what can happen is tight. */
const capAtEdge = (verdict: Verdict, caseId: string, checked: Checked) => verdict === 'pass' && openEdges(caseId, checked) > 0;

/**
 * The number that stands first: an unstable case before anything, then the stability quantity nearest its limit,
 * and without such a limit Ms. Its verdict is that of all cases together, whichever quantity it comes from; where it comes
 * from another, that one stands beside.
 *
 * @param results the judged cases, at least one
 * @param checked where those cases stand, and which ends of the grid were declared physical
 */
export function headline(results: readonly CaseResult[], checked: Checked): Headline {
  const overall = worstVerdict(results.map(({ verdict }) => verdict));
  const unstable = results.filter(({ numbers }) => !numbers.closedLoop.stable);
  const shared = { unstableCases: unstable.length, reason: null, beside: null, capped: false };
  if (unstable.length > 0) {
    const { case: first } = mostUnstable(unstable);
    const edges = edgesOf(first.id, checked);
    return { ...shared, ...undemanded, quantity: 'ms', value: null, frequency: null, case: first, verdict: overall, edges };
  }

  const findings = findingsIn(results);
  const measured = findings.filter((finding) => isStability(finding) && finding.check.value !== null);
  const nearest = worstFinding(measured, ({ result }) => openEdges(result.case.id, checked));
  const number = nearest ? numberOf(nearest) : highestMs(results);
  const capped = capAtEdge(overall, number.case.id, checked);
  return {
    ...shared,
    ...number,
    verdict: capped ? 'tight' : overall,
    reason: overall === 'notJudged' ? (results.find(({ verdict }) => verdict === 'notJudged')?.reason ?? null) : null,
    beside: besideHeadline(findings, { first: nearest, overall }),
    edges: edgesOf(number.case.id, checked),
    capped,
  };
}
