import { queryOptions } from '@tanstack/react-query';
import type { Case } from '@/contract';
import { request } from '../api/request';
import type { Page } from './page';
import { projectKey } from './projects';

export const casesQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...projectKey(projectId), 'cases'],
    queryFn: () => request<Page<Case>>('GET', `/projects/${projectId}/cases?limit=200`).then((page) => page.items),
  });
