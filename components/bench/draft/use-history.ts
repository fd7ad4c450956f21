import { useCallback } from 'react';
import { useStore } from 'zustand';
import { useBench } from '../bench-context';
import { current } from './draft';
import { redo, undo } from './draft-store';
import { changeWords } from './draft-words';

export interface HistoryStep {
  readonly possible: boolean;
  /** "Undo Kp 1.05 to 1.00", or the bare verb where there is nothing to take back. */
  readonly label: string;
  take(): void;
}

/** The two ways along the history, named after what they would change. */
export function useHistory(): { readonly undo: HistoryStep; readonly redo: HistoryStep } {
  const { store } = useBench();
  const settings = useStore(store, current);
  const past = useStore(store.temporal, ({ pastStates }) => pastStates.at(-1)?.settings);
  const future = useStore(store.temporal, ({ futureStates }) => futureStates.at(-1)?.settings);
  const takeBack = useCallback(() => undo(store), [store]);
  const takeAgain = useCallback(() => redo(store), [store]);
  const step = (verb: string, to: typeof past, take: () => void): HistoryStep => ({
    possible: to !== undefined,
    label: to === undefined ? verb : `${verb} ${changeWords(settings, to)}`,
    take,
  });
  return { undo: step('Undo', past, takeBack), redo: step('Redo', future, takeAgain) };
}
