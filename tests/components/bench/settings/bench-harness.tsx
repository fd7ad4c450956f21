import { render } from '@testing-library/react';
import type { ReactNode } from 'react';
import { BenchContext } from '@/components/bench/bench-context';
import { createDraftStore } from '@/components/bench/draft/draft-store';
import { contentWith, type Settings, startSettings } from '@/components/bench/draft/settings';
import { doTask } from '@/components/bench/engine/engine-tasks';
import { benchLoop, type BenchQuestion } from '@/components/bench/live/bench-loop';
import type { LiveAnalyser, LiveAnswer } from '@/components/bench/live/live-analyser';
import { createLookedAt } from '@/components/bench/live/looked-at';
import { loopAnswer, type LoopAnswer } from '@/components/bench/live/loop-answer';
import { createReadings } from '@/components/bench/live/readings';
import type { BenchSubject } from '@/components/bench/subject/bench-subject';
import { type Conditions, type FrozenCase, PlantContent } from '@/contract';

const content = PlantContent.parse({
  plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
  units: { input: 'kN·m', output: 'm/s' },
});
const plant = { ...content, id: 'plant', name: 'Speed', revision: 1 };
const nominal: FrozenCase = { id: 'nominal', name: 'nominal', parameters: {}, axes: {}, basis: 'figures', plant };
const conditions: Conditions = { cases: [nominal], limits: [], operatingRange: [] };
const subject = { plant, shownCase: nominal, conditions, opened: null } as unknown as BenchSubject;

function answeringAtOnce<Input, Output>(compute: (input: Input) => Output): LiveAnalyser<Input, Output> {
  const listeners = new Set<() => void>();
  let answer: LiveAnswer<Input, Output> | null = null;
  return {
    ask(input) {
      const output = compute(input);
      answer = { input, output, complete: output, rested: output, detail: 'full', problem: null };
      for (const listener of listeners) listener();
    },
    get: () => answer!,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    stop: () => listeners.clear(),
  };
}

/** A part of the bench over a draft and the engine itself, which answers at once; the store is handed back to look at. */
export function onTheBench(part: ReactNode, settings: Partial<Settings> = {}) {
  const latest = { revision: 3, settings: { ...startSettings, ...settings } };
  const store = createDraftStore({ key: 'draft', latest, storage: null });
  const analyser = answeringAtOnce(({ loop }: BenchQuestion): LoopAnswer =>
    loopAnswer(loop, doTask('analyse', { loop, detail: 'full', end: null })),
  );
  const over = answeringAtOnce((moved: Settings) =>
    doTask('judge', { design: contentWith(null, moved), conditions, cases: conditions.cases, detail: 'full' }),
  );
  const ask = () => {
    const now = store.getState().held ?? store.getState().settings;
    analyser.ask({ settings: now, loop: benchLoop(subject, now, { reference: 1, load: 1 }) });
    over.ask(now);
  };
  ask();
  store.subscribe(ask);
  const readings = createReadings(analyser, (task) => task());
  const lookedAt = createLookedAt({ parts: 'frequency', end: null });
  render(<BenchContext.Provider value={{ subject, store, analyser, readings, lookedAt, over }}>{part}</BenchContext.Provider>);
  return { store, analyser };
}
