import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { CreateDesign, DesignRevision, ReviseDesign, RevisedDesign } from '@/contract';
import { hasStatus } from '../api/problem';
import { staleTimes } from '../api/query-client';
import { request } from '../api/request';
import { analysisKey } from './analyses';
import type { Page } from './page';
import { projectKey } from './projects';

export const designsKey = (projectId: string) => [...projectKey(projectId), 'designs'] as const;

/** The newest revision of each design of a project. */
export const designsQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...designsKey(projectId), 'list'],
    queryFn: () => request<Page<DesignRevision>>('GET', `/projects/${projectId}/designs`).then((page) => page.items),
  });

export const designRevisionQuery = (projectId: string, designId: string, revision: number) =>
  queryOptions({
    queryKey: [...designsKey(projectId), designId, 'revisions', revision],
    staleTime: staleTimes.frozen,
    queryFn: () => request<DesignRevision>('GET', `/projects/${projectId}/designs/${designId}/revisions/${revision}`),
  });

export function useCreateDesign(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (design: CreateDesign) => request<DesignRevision>('POST', `/projects/${projectId}/designs`, { body: design }),
    onSuccess: () => client.invalidateQueries({ queryKey: projectKey(projectId) }),
  });
}

/** Keeps a revision; with `analyse` its analysis comes with it and need not be fetched again. */
export function useReviseDesign(projectId: string, designId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (design: ReviseDesign) =>
      request<RevisedDesign>('POST', `/projects/${projectId}/designs/${designId}/revisions`, { body: design }),
    onSuccess: ({ analysis }) => {
      if (analysis) client.setQueryData(analysisKey(projectId, analysis.id), analysis);
      return client.invalidateQueries({ queryKey: projectKey(projectId), refetchType: 'active' });
    },
    // Someone kept a newer revision: what it is must be seen before there is anything to decide.
    onError: (error) => {
      if (hasStatus(error, 409)) void client.invalidateQueries({ queryKey: projectKey(projectId), refetchType: 'active' });
    },
  });
}
