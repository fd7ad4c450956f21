import { createContext, useContext, useSyncExternalStore } from 'react';
import { useStore } from 'zustand';
import { current } from './draft/draft';
import type { Warning } from '@/contract';
import type { DraftState, DraftStore } from './draft/draft-store';
import type { Settings } from './draft/settings';
import type { LiveAnalyser, LiveAnswer } from './live/live-analyser';
import type { LookedAtStore } from './live/looked-at';
import type { LoopAnswer } from './live/loop-answer';
import type { Readings } from './live/readings';
import type { OverCases } from './over/use-over-cases';
import type { BenchSubject } from './subject/bench-subject';
import type { BenchQuestion } from './live/bench-loop';

/** The same for all parts of one bench; what changes with every gesture is in the store. */
export interface BenchValue {
  readonly subject: BenchSubject;
  readonly store: DraftStore;
  readonly analyser: LiveAnalyser<BenchQuestion, LoopAnswer>;
  readonly readings: Readings<BenchQuestion, LoopAnswer>;
  readonly lookedAt: LookedAtStore;
  /** The same over all cases. */
  readonly over: OverCases;
}

export const BenchContext = createContext<BenchValue | null>(null);

export function useBench(): BenchValue {
  const bench = useContext(BenchContext);
  if (bench === null) throw new Error('Parts of the bench stand inside a Bench.');
  return bench;
}

/** A part of the draft; only what reads a part that changed is rendered again. */
export const useDraft = <Part>(select: (draft: DraftState) => Part): Part => useStore(useBench().store, select);

/** The settings on the bench this moment. */
export const useSettings = (): Settings => useDraft(current);

/** The engine's answer for what is read and not looked at: it follows the curves at a pace of its own. */
export function useReading(): LiveAnswer<BenchQuestion, LoopAnswer> {
  const { readings } = useBench();
  return useSyncExternalStore(readings.subscribe, readings.get);
}

/** Whether the engine has answered yet. */
export function useHasAnswer(): boolean {
  const { analyser } = useBench();
  return useSyncExternalStore(analyser.subscribe, () => analyser.get().output !== null);
}

/** What is kept of the engine's answers from one rest to the next: what calls this is not rendered while a gain moves. */
export function useRestedAnswer(): LoopAnswer | null {
  const { analyser } = useBench();
  return useSyncExternalStore(analyser.subscribe, () => analyser.get().rested);
}

/** The question whose answer stands in full; null while a gain moves. */
export function useRestingQuestion(): BenchQuestion | null {
  const { analyser } = useBench();
  return useSyncExternalStore(analyser.subscribe, () => {
    const { input, detail, problem } = analyser.get();
    return detail === 'full' && problem === null ? input : null;
  });
}

const NO_WARNINGS: readonly Warning[] = [];

/** What the engine warns of, as of the newest answer that looked at everything. */
export function useWarnings(): readonly Warning[] {
  const { analyser } = useBench();
  return useSyncExternalStore(analyser.subscribe, () => {
    const { complete, rested } = analyser.get();
    const newest = complete?.loop === rested?.loop ? rested : complete;
    const warnings = newest?.analysis.warnings ?? NO_WARNINGS;
    return warnings.length === 0 ? NO_WARNINGS : warnings;
  });
}
