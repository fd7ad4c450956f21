import { queryOptions, useMutation, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import type { DeviceSession, Me, UpdateMe } from '@/contract';
import { hasStatus } from '../api/problem';
import { meKey, staleTimes } from '../api/query-client';
import { request } from '../api/request';
import type { Page } from './page';

const sessionsKey = ['me', 'sessions'] as const;

/** Who is signed in; null where nobody is. */
export const meQuery = queryOptions({
  queryKey: meKey,
  staleTime: staleTimes.account,
  queryFn: async (): Promise<Me | null> => {
    try {
      return await request<Me>('GET', '/me');
    } catch (error) {
      if (hasStatus(error, 401)) return null;
      throw error;
    }
  },
});

/** Who is signed in, on pages behind the gate: it is known there that somebody is. */
export function useMe(): Me {
  const { data } = useSuspenseQuery(meQuery);
  if (!data) throw new Error('This page stands behind the sign-in gate.');
  return data;
}

/** Name and preferences. The change shows at once and is taken back if the server refuses it. */
export function useUpdateMe() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: UpdateMe) => request<Me>('PATCH', '/me', { body: change }),
    onMutate: (change) => {
      const before = client.getQueryData<Me | null>(meKey);
      if (before) {
        const preferences = { ...before.preferences, ...change.preferences };
        client.setQueryData(meKey, { ...before, ...change, preferences });
      }
      return before;
    },
    onError: (error, _change, before) => {
      const signedOut = hasStatus(error, 401);
      if (!signedOut) client.setQueryData(meKey, before);
    },
    onSuccess: (me) => client.setQueryData(meKey, me),
  });
}

export const sessionsQuery = queryOptions({
  queryKey: sessionsKey,
  queryFn: () => request<Page<DeviceSession>>('GET', '/me/sessions').then((page) => page.items),
});

export function useRevokeSession() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (sessionId: string) => request<void>('DELETE', `/me/sessions/${sessionId}`),
    onSuccess: () => client.invalidateQueries({ queryKey: sessionsKey }),
  });
}
