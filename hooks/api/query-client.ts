import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './problem';

/** How long an answer counts as fresh, and how long it is kept for reading without signal. */
export const staleTimes = { shared: 15_000, account: 60_000, frozen: Infinity } as const;
const KEPT_FOR_MS = 24 * 60 * 60 * 1000;
const MOST_RETRIES = 2;

/** A refusal is an answer and is not asked for again; a failure is, twice. */
const retry = (failures: number, error: Error): boolean => !(error instanceof ApiProblem && error.status < 500) && failures < MOST_RETRIES;

export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: { staleTime: staleTimes.shared, gcTime: KEPT_FOR_MS, retry, refetchOnWindowFocus: true },
      // Keeping needs signal and says so at once: no queue.
      mutations: { networkMode: 'always', retry: false },
    },
  });
