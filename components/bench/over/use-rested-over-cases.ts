import { useMemo, useSyncExternalStore } from 'react';
import { useBench } from '../bench-context';
import type { Settings } from '../draft/settings';
import type { CasesAnswer } from '../engine/case-tasks';

export interface RestedOverCases {
  readonly settings: Settings;
  readonly answer: CasesAnswer;
}

/** The verdicts in full over all cases; null while a gain moves, and what calls this is not rendered meanwhile. */
export function useRestedOverCases(): RestedOverCases | null {
  const { over } = useBench();
  const resting = useSyncExternalStore(over.subscribe, () => {
    const standing = over.get();
    return standing.detail === 'full' && standing.problem === null ? standing : null;
  });
  return useMemo(() => {
    if (!resting || resting.input === null || resting.rested === null) return null;
    return { settings: resting.input, answer: resting.rested };
  }, [resting]);
}
