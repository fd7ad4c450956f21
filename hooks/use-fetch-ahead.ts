import { useEffect } from 'react';

/** Time for the page that was asked for to be there first. */
const DELAY_MS = 1500;

/**
 * Fetches the code of pages that may be opened next, so that moving to them needs no signal.
 * One that cannot be fetched now is asked for again when it is opened.
 */
export function useFetchAhead(fetchers: readonly (() => Promise<unknown>)[]): void {
  useEffect(() => {
    const timer = setTimeout(() => void Promise.allSettled(fetchers.map((fetchCode) => fetchCode())), DELAY_MS);
    return () => clearTimeout(timer);
  }, [fetchers]);
}
