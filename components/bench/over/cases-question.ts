import type { CaseResult, Conditions } from '@/contract';
import { contentWith, type Settings } from '../draft/settings';
import type { CasesAnswer, CasesQuestion } from '../engine/case-tasks';
import type { BenchSubject } from '../subject/bench-subject';

/** So many cases are followed while a gain moves; of more, those that stood nearest their limits. */
export const MOST_MOVING = 48;

/** How near its limits a case stands: not stable before anything, then by the greatest use. */
const nearness = ({ checks, verdict, numbers }: CaseResult): number => {
  if (!numbers.closedLoop.stable) return Infinity;
  const uses = checks.flatMap(({ use }) => (use === null ? [] : [use]));
  return uses.length === 0 ? (verdict === 'fail' ? Infinity : numbers.sensitivity.ms.value) : Math.max(...uses);
};

/** The cases nearest their limits first. Results are of these conditions, or of conditions before; an unknown case comes first. */
export function nearestFirst({ cases }: Conditions, results: readonly CaseResult[]): Conditions['cases'] {
  const known = new Map(results.map((result) => [result.case.id, nearness(result)]));
  const of = (id: string) => known.get(id) ?? Infinity;
  return [...cases].sort((a, b) => of(b.id) - of(a.id) || 0);
}

interface Asked {
  readonly subject: Pick<BenchSubject, 'conditions' | 'opened'>;
  readonly settings: Settings;
  readonly detail: CasesQuestion['detail'];
  /** The newest answer in full. */
  readonly rested: CasesAnswer | null;
}

/** What the engine is asked over the cases: all of them at rest, the nearest while a gain moves. In their own order either way. */
export function casesQuestion({ subject: { conditions, opened }, settings, detail, rested }: Asked): CasesQuestion {
  const design = contentWith(opened, settings);
  if (detail === 'full' || conditions.cases.length <= MOST_MOVING) return { design, conditions, cases: conditions.cases, detail };
  const nearest = new Set(
    nearestFirst(conditions, rested?.results ?? [])
      .slice(0, MOST_MOVING)
      .map(({ id }) => id),
  );
  return { design, conditions, cases: conditions.cases.filter(({ id }) => nearest.has(id)), detail };
}
