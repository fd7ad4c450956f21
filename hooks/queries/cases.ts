import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Case, CreateCase, CreateGrid, UpdateCase } from '@/contract';
import { request } from '../api/request';
import { type Page, query } from './page';
import { projectKey } from './projects';

export const casesKey = (projectId: string) => [...projectKey(projectId), 'cases'] as const;

async function everyCase(projectId: string, cursor: string | null = null): Promise<Case[]> {
  const page = await request<Page<Case>>('GET', `/projects/${projectId}/cases${query({ limit: '200', cursor })}`);
  return page.nextCursor === null ? page.items : [...page.items, ...(await everyCase(projectId, page.nextCursor))];
}

export const casesQuery = (projectId: string) => queryOptions({ queryKey: casesKey(projectId), queryFn: () => everyCase(projectId) });

/** A change of one case makes everything stale that is judged over the cases. */
function useCaseMutation<Input, Answer>(projectId: string, mutationFn: (input: Input) => Promise<Answer>) {
  const client = useQueryClient();
  return useMutation({ mutationFn, onSettled: () => client.invalidateQueries({ queryKey: projectKey(projectId) }) });
}

export const useCreateCase = (projectId: string) =>
  useCaseMutation(projectId, (added: CreateCase) => request<Case>('POST', `/projects/${projectId}/cases`, { body: added }));

export const useCreateGrid = (projectId: string) =>
  useCaseMutation(projectId, (grid: CreateGrid) => request<{ items: Case[] }>('POST', `/projects/${projectId}/cases/grid`, { body: grid }));

type Seen = Pick<Case, 'id' | 'etag'>;

export const useUpdateCase = (projectId: string) =>
  useCaseMutation(projectId, ({ id, etag, changes }: Seen & { changes: UpdateCase }) =>
    request<Case>('PATCH', `/projects/${projectId}/cases/${id}`, { body: changes, ifMatch: etag }),
  );

export const useDeleteCase = (projectId: string) =>
  useCaseMutation(projectId, ({ id, etag }: Seen) => request<void>('DELETE', `/projects/${projectId}/cases/${id}`, { ifMatch: etag }));
