import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem, hasStatus } from './problem';

/** How long an answer counts as fresh, and how long it is kept for reading without signal. */
export const staleTimes = { shared: 15_000, account: 60_000, frozen: Infinity } as const;
const KEPT_FOR_MS = 24 * 60 * 60 * 1000;
const MOST_RETRIES = 2;

/** A refusal is an answer and is not asked for again; a failure is, twice. */
const retry = (failures: number, error: Error): boolean => !(error instanceof ApiProblem && error.status < 500) && failures < MOST_RETRIES;

export const meKey = ['me'] as const;

/** The client's one cache of answers. A session that has ended shows wherever it is met, and the gate then asks for a new one. */
export function createQueryClient(): QueryClient {
  const noticeEnd = (error: Error) => {
    if (hasStatus(error, 401)) client.setQueryData(meKey, null);
  };
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({ onError: noticeEnd }),
    mutationCache: new MutationCache({ onError: noticeEnd }),
    defaultOptions: {
      queries: { staleTime: staleTimes.shared, gcTime: KEPT_FOR_MS, retry },
      // Keeping needs signal and says so at once: no queue.
      mutations: { networkMode: 'always', retry: false },
    },
  });
  return client;
}
