import { useMemo, useSyncExternalStore } from 'react';
import { useBench } from '../bench-context';
import type { Settings } from '../draft/settings';
import type { CasesAnswer } from '../engine/case-tasks';

export interface RestedOverCases {
  readonly settings: Settings;
  readonly answer: CasesAnswer;
}

/** The verdicts in full over all cases; null while a gain moves. */
export function useRestedOverCases(): RestedOverCases | null {
  const { over } = useBench();
  const standing = useSyncExternalStore(over.subscribe, over.get);
  const { input, rested, detail, problem } = standing;
  const full = detail === 'full' && problem === null;
  return useMemo(() => (full && input !== null && rested !== null ? { settings: input, answer: rested } : null), [full, input, rested]);
}
