import type { Case, CaseResult, Conditions, FrozenCase, KeptAnalysis } from '@/contract';
import { runsOtherwise } from './changed-since';

/** One case of now, with what the newest kept analysis says of it. */
export interface CaseView {
  readonly kept: Case;
  /** With its plant; null where the case does not go with its plant any more. */
  readonly now: FrozenCase | null;
  readonly frozen: FrozenCase | null;
  readonly result: CaseResult | null;
  /** The loop of this case is another one than the one that was analysed: its numbers are those of before. */
  readonly outdated: boolean;
}

/** Joins the cases of now with the results of an analysis. A case that was taken away since is not among them. */
export function caseViews(cases: readonly Case[], conditions: Conditions | null, analysis: KeptAnalysis | null): CaseView[] {
  const now = new Map(conditions?.cases.map((one) => [one.id, one]));
  const frozen = new Map(analysis?.inputs.cases.map((one) => [one.id, one]));
  const results = new Map(analysis?.results.map((one) => [one.case.id, one]));
  return cases.map((kept) => {
    const [current, was] = [now.get(kept.id) ?? null, frozen.get(kept.id) ?? null];
    return {
      kept,
      now: current,
      frozen: was,
      result: results.get(kept.id) ?? null,
      outdated: current !== null && was !== null && runsOtherwise(was, current),
    };
  });
}
