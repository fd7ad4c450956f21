import { queryOptions, useMutation } from '@tanstack/react-query';
import type { Conditions, Judge, Judged } from '@/contract';
import { request } from '../api/request';
import { projectKey } from './projects';

/** Cases with their plants ready to run, limits and operating range: what the bench judges against while a gain moves. */
export const conditionsQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...projectKey(projectId), 'conditions'],
    queryFn: () => request<Conditions>('GET', `/projects/${projectId}/conditions`),
  });

/** What a design would be worth over the project's cases, computed by the server and not kept. */
export const useJudge = (projectId: string) =>
  useMutation({ mutationFn: (design: Judge) => request<Judged>('POST', `/projects/${projectId}/judge`, { body: design }) });
