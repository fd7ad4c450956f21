import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Analysis, AnalysisSummary, CreateAnalysis, JobAnswer, KeptAnalysis, Recomputed } from '@/contract';
import { staleTimes } from '../api/query-client';
import { request } from '../api/request';
import { resultOf } from './jobs';
import { type Page, query } from './page';
import { projectKey } from './projects';

/** Apart from the project's other keys: a frozen analysis is not made stale by a change of the project. */
export const analysisKey = (projectId: string, analysisId: string) => ['analyses', projectId, analysisId] as const;

export const analysesQuery = (projectId: string) =>
  infiniteQueryOptions({
    queryKey: [...projectKey(projectId), 'analyses'],
    queryFn: ({ pageParam }) => request<Page<AnalysisSummary>>('GET', `/projects/${projectId}/analyses${query({ cursor: pageParam })}`),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    select: (data) => data.pages.flatMap((page) => page.items),
  });

export const analysisQuery = (projectId: string, analysisId: string) =>
  queryOptions({
    queryKey: analysisKey(projectId, analysisId),
    staleTime: staleTimes.frozen,
    queryFn: () => request<KeptAnalysis>('GET', `/projects/${projectId}/analyses/${analysisId}`),
  });

/** One case with its curves, computed again from what was frozen. */
export const caseAnalysisQuery = (projectId: string, analysisId: string, caseId: string) =>
  queryOptions({
    queryKey: [...analysisKey(projectId, analysisId), 'cases', caseId],
    staleTime: staleTimes.frozen,
    queryFn: () => request<Analysis>('GET', `/projects/${projectId}/analyses/${analysisId}/cases/${caseId}`),
  });

export function useCreateAnalysis(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (choice: CreateAnalysis) => {
      const begun = await request<KeptAnalysis | JobAnswer>('POST', `/projects/${projectId}/analyses`, { body: choice });
      if (!('job' in begun)) return begun;
      const { analysisId } = await resultOf(begun.job);
      return request<KeptAnalysis>('GET', `/projects/${projectId}/analyses/${analysisId}`);
    },
    onSuccess: (analysis) => {
      client.setQueryData(analysisKey(projectId, analysis.id), analysis);
      return client.invalidateQueries({ queryKey: projectKey(projectId) });
    },
  });
}

export const useRecompute = (projectId: string, analysisId: string) =>
  useMutation({
    mutationFn: () => request<Recomputed>('POST', `/projects/${projectId}/analyses/${analysisId}/recompute`, { body: {} }),
  });
