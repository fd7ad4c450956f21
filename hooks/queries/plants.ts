import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { CreatePlant, PlantModel, PlantReading, PlantRevision, RevisePlant } from '@/contract';
import { staleTimes } from '../api/query-client';
import { request } from '../api/request';
import type { Page } from './page';
import { projectKey } from './projects';

export const plantsKey = (projectId: string) => [...projectKey(projectId), 'plants'] as const;

/** The newest revision of each plant of a project. */
export const plantsQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...plantsKey(projectId), 'list'],
    queryFn: () => request<Page<PlantRevision>>('GET', `/projects/${projectId}/plants`).then((page) => page.items),
  });

export const plantRevisionsQuery = (projectId: string, plantId: string) =>
  queryOptions({
    queryKey: [...plantsKey(projectId), plantId, 'revisions'],
    queryFn: () =>
      request<Page<PlantRevision>>('GET', `/projects/${projectId}/plants/${plantId}/revisions?limit=200`).then((page) => page.items),
  });

/** A revision never changes, so it is asked for once. */
export const plantRevisionQuery = (projectId: string, plantId: string, revision: number) =>
  queryOptions({
    queryKey: [...plantsKey(projectId), plantId, 'revisions', revision],
    staleTime: staleTimes.frozen,
    queryFn: () => request<PlantRevision>('GET', `/projects/${projectId}/plants/${plantId}/revisions/${revision}`),
  });

/** What a plant reads as. The same text always reads the same, so it is asked for once. */
export const plantReadingQuery = (plant: PlantModel) =>
  queryOptions({
    queryKey: ['plantReading', plant],
    staleTime: staleTimes.frozen,
    queryFn: ({ signal }) => request<PlantReading>('POST', '/plants/read', { body: { plant }, signal }),
  });

export function useCreatePlant(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (plant: CreatePlant) => request<PlantRevision>('POST', `/projects/${projectId}/plants`, { body: plant }),
    onSuccess: () => void client.invalidateQueries({ queryKey: projectKey(projectId) }),
  });
}

export function useRevisePlant(projectId: string, plantId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (plant: RevisePlant) =>
      request<PlantRevision>('POST', `/projects/${projectId}/plants/${plantId}/revisions`, { body: plant }),
    // Also where it was refused: someone may have kept a revision meanwhile, and the editor has to say so.
    onSettled: () => void client.invalidateQueries({ queryKey: projectKey(projectId) }),
  });
}
