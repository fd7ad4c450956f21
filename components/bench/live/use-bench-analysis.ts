import { useEffect, useMemo, useSyncExternalStore } from 'react';
import type { BenchValue } from '../bench-context';
import { current } from '../draft/draft';
import type { DraftStore } from '../draft/draft-store';
import type { Settings } from '../draft/settings';
import type { BenchSubject } from '../subject/bench-subject';
import { benchLoop, type BenchQuestion, type StepSizes } from './bench-loop';
import { createLiveAnalyser, type LiveAnalyser } from './live-analyser';
import { createLookedAt, type LookedAtStore, stepsFor } from './looked-at';
import { answerLoop, explainLoopError, type LoopAnswer } from './loop-answer';
import { pageSchedule } from './page-schedule';

type BenchAnalyser = LiveAnalyser<BenchQuestion, LoopAnswer>;

const createBenchAnalyser = (lookedAt: LookedAtStore): BenchAnalyser =>
  createLiveAnalyser({
    compute: ({ loop }, detail, outline) => answerLoop(loop, detail, { outline, end: lookedAt.get().end }),
    steps: () => stepsFor(lookedAt.get()),
    explain: explainLoopError,
    schedule: pageSchedule,
  });

const settled = createLookedAt({ parts: 'frequency', end: null });

const useStepSizes = ({ reference, load }: StepSizes): StepSizes => useMemo(() => ({ reference, load }), [reference, load]);

/** Answers for what is on the bench, gesture under way included. */
export function useBenchAnalysis(subject: BenchSubject, store: DraftStore, sizes: StepSizes): Pick<BenchValue, 'analyser' | 'lookedAt'> {
  const lookedAt = useMemo(() => createLookedAt({ parts: 'all', end: null }), []);
  const analyser = useMemo(() => createBenchAnalyser(lookedAt), [lookedAt]);
  const steps = useStepSizes(sizes);
  const { plant, shownCase, opened } = subject;
  useEffect(() => {
    let asked: Settings | null = null;
    const ask = () => {
      const settings = current(store.getState());
      if (settings === asked) return;
      asked = settings;
      analyser.ask({ settings, loop: benchLoop({ plant, shownCase, opened }, settings, steps) });
    };
    ask();
    return store.subscribe(ask);
  }, [analyser, store, plant, shownCase, opened, steps]);
  useEffect(() => () => analyser.stop(), [analyser]);
  return useMemo(() => ({ analyser, lookedAt }), [analyser, lookedAt]);
}

/** The answer in full for settings that do not move (design B); null while there is none. */
export function useSettledAnalysis(subject: BenchSubject, settings: Settings | null, sizes: StepSizes): LoopAnswer | null {
  const analyser = useMemo(() => createBenchAnalyser(settled), []);
  const steps = useStepSizes(sizes);
  const { plant, shownCase, opened } = subject;
  useEffect(() => {
    if (settings !== null) analyser.ask({ settings, loop: benchLoop({ plant, shownCase, opened }, settings, steps) });
  }, [analyser, settings, plant, shownCase, opened, steps]);
  useEffect(() => () => analyser.stop(), [analyser]);
  const { complete } = useSyncExternalStore(analyser.subscribe, analyser.get);
  return settings === null ? null : complete;
}
