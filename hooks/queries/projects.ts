import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Activity, CreateProject, Project, UpdateProject } from '@/contract';
import { ask, request } from '../api/request';
import { type Page, query } from './page';

export const projectsKey = ['projects'] as const;
export const projectKey = (projectId: string) => [...projectsKey, projectId] as const;
const listKey = (archived: boolean) => [...projectsKey, 'list', { archived }] as const;

/** A project with the version it was read in, which a change of it must name. */
export type ReadProject = Project & { etag: string | null };

export const projectsQuery = (archived = false) =>
  infiniteQueryOptions({
    queryKey: listKey(archived),
    queryFn: ({ pageParam }) =>
      request<Page<Project>>('GET', `/projects${query({ cursor: pageParam, archived: archived ? 'true' : undefined })}`),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    select: (data) => data.pages.flatMap((page) => page.items),
  });

export const projectQuery = (projectId: string) =>
  queryOptions({
    queryKey: projectKey(projectId),
    queryFn: async (): Promise<ReadProject> => {
      const { body, etag } = await ask<Project>('GET', `/projects/${projectId}`);
      return { ...body, etag };
    },
  });

export const activityQuery = (projectId: string) =>
  infiniteQueryOptions({
    queryKey: [...projectKey(projectId), 'activity'],
    queryFn: ({ pageParam }) =>
      request<Page<Activity>>('GET', `/projects/${projectId}/activity${query({ cursor: pageParam, limit: '20' })}`),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    select: (data) => data.pages.flatMap((page) => page.items),
  });

export function useCreateProject() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (project: CreateProject) => request<Project>('POST', '/projects', { body: project }),
    onSuccess: () => client.invalidateQueries({ queryKey: projectsKey }),
  });
}

export function useUpdateProject(project: ReadProject) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: UpdateProject) => request<Project>('PATCH', `/projects/${project.id}`, { body: change, ifMatch: project.etag }),
    onSettled: () => client.invalidateQueries({ queryKey: projectsKey }),
  });
}

export function useDeleteProject(project: ReadProject) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (confirmName: string) =>
      request<void>('DELETE', `/projects/${project.id}`, { body: { confirmName }, ifMatch: project.etag }),
    onSuccess: () => {
      client.removeQueries({ queryKey: projectKey(project.id) });
      return client.invalidateQueries({ queryKey: projectsKey });
    },
  });
}
