import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Limits, PutLimits } from '@/contract';
import { ask } from '../api/request';
import { projectKey } from './projects';

export const limitsKey = (projectId: string) => [...projectKey(projectId), 'limits'] as const;

/** Limits with the version they were read in, which a change of them must name. */
export type ReadLimits = Limits & { etag: string | null };

export const limitsQuery = (projectId: string) =>
  queryOptions({
    queryKey: limitsKey(projectId),
    queryFn: async (): Promise<ReadLimits> => {
      const { body, etag } = await ask<Limits>('GET', `/projects/${projectId}/limits`);
      return { ...body, etag };
    },
  });

/**
 * Puts limits over the version that was read. What was put is known at once with its new version; a 412 says that someone else
 * was first, and theirs are fetched.
 */
export function usePutLimits(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ items, etag: seen }: PutLimits & Pick<ReadLimits, 'etag'>): Promise<ReadLimits> => {
      const { body, etag } = await ask<Limits>('PUT', `/projects/${projectId}/limits`, { body: { items }, ifMatch: seen });
      return { ...body, etag };
    },
    onSuccess: (kept) => client.setQueryData(limitsKey(projectId), kept),
    onSettled: () => client.invalidateQueries({ queryKey: projectKey(projectId) }),
  });
}
