import type { Analysis, CaseResult, Conditions, DesignContent, Headline } from '@/contract';
import { headline } from './headline';
import { judgeCase } from './judge-case';

export interface JudgedCases {
  /** In the order of the cases. */
  readonly results: CaseResult[];
  readonly headline: Headline;
}

/**
 * Analysed cases laid against the project's limits, one by one and together.
 *
 * @param numbers of each case of `conditions`, in the same order
 */
export function judgeCases(
  { sampling }: Pick<DesignContent, 'sampling'>,
  conditions: Conditions,
  numbers: readonly Analysis[],
): JudgedCases {
  const results = conditions.cases.map(({ id, name, plant }, index) => {
    const stated = { sampling: sampling !== null, deadTime: plant.deadTimeBasis !== null };
    return { case: { id, name }, ...judgeCase(conditions.limits, numbers[index], stated), numbers: numbers[index] };
  });
  return { results, headline: headline(results, conditions) };
}
