import { useEffect } from 'react';
import { useBench } from '../bench-context';
import type { LookedAt } from './looked-at';

/** Tells the engine which curves the screen shows now. */
export function useLookingAt(parts: LookedAt['parts']): void {
  const { lookedAt } = useBench();
  useEffect(() => {
    lookedAt.set({ parts });
  }, [lookedAt, parts]);
}
