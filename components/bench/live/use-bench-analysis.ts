import { useEffect, useMemo, useSyncExternalStore } from 'react';
import type { BenchValue } from '../bench-context';
import { current } from '../draft/draft';
import type { DraftStore } from '../draft/draft-store';
import type { Settings } from '../draft/settings';
import { engines } from '../engine/engines';
import type { Detail } from '../engine/engine-tasks';
import type { BenchSubject } from '../subject/bench-subject';
import { afterRest } from './after-rest';
import { benchLoop, type BenchQuestion, type StepSizes } from './bench-loop';
import { createLiveAnalyser, type LiveAnalyser } from './live-analyser';
import { createLookedAt, type LookedAtStore, stepsFor } from './looked-at';
import { explainLoopError, loopAnswer, type LoopAnswer } from './loop-answer';
import { createReadings } from './readings';

type BenchAnalyser = LiveAnalyser<BenchQuestion, LoopAnswer>;

async function askEngine({ loop }: BenchQuestion, detail: Detail, end: number | null): Promise<LoopAnswer> {
  const { curves, responses } = engines();
  const engine = detail === 'outline' ? curves : responses;
  return loopAnswer(loop, await engine.run('analyse', { loop, detail, end }));
}

const createBenchAnalyser = (lookedAt: LookedAtStore): BenchAnalyser =>
  createLiveAnalyser({
    compute: (question, detail) => askEngine(question, detail, lookedAt.get().end),
    steps: () => stepsFor(lookedAt.get()),
    explain: explainLoopError,
    rest: afterRest,
  });

const settled = createLookedAt({ parts: 'frequency', end: null });

const useStepSizes = ({ reference, load }: StepSizes): StepSizes => useMemo(() => ({ reference, load }), [reference, load]);

/** Answers for what is on the bench, gesture under way included. */
export function useBenchAnalysis(
  subject: BenchSubject,
  store: DraftStore,
  sizes: StepSizes,
): Pick<BenchValue, 'analyser' | 'readings' | 'lookedAt'> {
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
  const readings = useMemo(() => createReadings(analyser), [analyser]);
  return useMemo(() => ({ analyser, readings, lookedAt }), [analyser, readings, lookedAt]);
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
