import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Conditions, KeptAnalysis } from '@/contract';
import { hasStatus, sentence } from '@/hooks/api/problem';
import { analysisQuery } from '@/hooks/queries/analyses';
import { casesQuery } from '@/hooks/queries/cases';
import { conditionsQuery } from '@/hooks/queries/conditions';
import type { ReadProject } from '@/hooks/queries/projects';
import { caseViews, type CaseView } from './model/case-view';

export interface CaseData {
  readonly views: readonly CaseView[];
  /** The newest that was kept; null until one was. */
  readonly analysis: KeptAnalysis | null;
  readonly conditions: Conditions | null;
  /** A case that does not go with its plant any more, in words. */
  readonly misfit: string | null;
}

/** The cases of now beside what the newest kept analysis says of them. */
export function useCaseData({ id, latestAnalysis }: ReadProject) {
  const cases = useQuery(casesQuery(id));
  const conditions = useQuery(conditionsQuery(id));
  const analysis = useQuery({ ...analysisQuery(id, latestAnalysis?.id ?? ''), enabled: latestAnalysis !== null });
  const misfit = hasStatus(conditions.error, 409) ? sentence(conditions.error) : null;
  const settled = misfit !== null || conditions.data !== undefined;
  const waiting = [cases, conditions, analysis].find(
    (query) => query.isLoading || (query.isError && query.data === undefined && query !== conditions),
  );
  const data = useMemo((): CaseData | undefined => {
    const kept = latestAnalysis === null ? null : analysis.data;
    if (!cases.data || !settled || kept === undefined) return undefined;
    const now = misfit === null ? (conditions.data ?? null) : null;
    return { views: caseViews(cases.data, now, kept), analysis: kept, conditions: now, misfit };
  }, [cases.data, conditions.data, analysis.data, latestAnalysis, settled, misfit]);
  const asked = waiting ?? (settled ? cases : conditions);
  return {
    data,
    error: asked.error,
    fetchStatus: asked.fetchStatus,
    refetch: () => [cases, conditions, analysis].forEach((query) => query.isError && void query.refetch()),
  };
}
