import { judgeLimit } from '@/analysis/project';
import { worstChecks, type WorstCheck } from '@/components/verdict/worst-checks';
import type { CaseResult, KeptAnalysis, Limit, Verdict } from '@/contract';

type Kept = Pick<KeptAnalysis, 'inputs' | 'results'>;

/** What nobody stated leaves a case not judged, whatever its numbers; an unstable loop fails before that. */
function verdictIn({ inputs }: Kept, { case: { id }, numbers }: CaseResult, verdict: Verdict): Verdict {
  const stated = inputs.design.sampling !== null && inputs.cases.find((known) => known.id === id)?.plant.deadTimeBasis !== null;
  return stated || !numbers.closedLoop.stable ? verdict : 'notJudged';
}

/** Where a kept analysis would stand against these limits, one after the other: the worst over its cases. */
export function standings(kept: Kept, limits: readonly Limit[]): WorstCheck[] {
  return worstChecks(
    kept.results.map((result) => ({
      case: result.case,
      checks: limits.map((limit) => {
        const check = judgeLimit(limit, result.numbers);
        return { ...check, verdict: verdictIn(kept, result, check.verdict) };
      }),
    })),
  );
}
