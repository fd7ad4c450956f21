import { useEffect, useMemo } from 'react';
import { current } from '../draft/draft';
import type { DraftStore } from '../draft/draft-store';
import type { Settings } from '../draft/settings';
import type { CasesAnswer } from '../engine/case-tasks';
import { engines } from '../engine/engines';
import { afterRest } from '../live/after-rest';
import { createLiveAnalyser, type LiveAnalyser } from '../live/live-analyser';
import { explainLoopError } from '../live/loop-answer';
import { createReadings, type Readings } from '../live/readings';
import type { BenchSubject } from '../subject/bench-subject';
import { casesQuestion } from './cases-question';

/** A design's verdicts over all cases as a gain moves: coarse and perhaps of the nearest cases alone, in full and of all at rest. */
export type OverCases = Readings<Settings, CasesAnswer>;

type Conditions = Pick<BenchSubject, 'conditions' | 'opened'>;

function createCasesAnalyser(subject: Conditions): LiveAnalyser<Settings, CasesAnswer> {
  const analyser: LiveAnalyser<Settings, CasesAnswer> = createLiveAnalyser({
    compute(settings, detail) {
      const question = casesQuestion({ subject, settings, detail: detail === 'full' ? 'full' : 'live', rested: analyser.get().rested });
      return engines().cases.run('judge', question);
    },
    explain: explainLoopError,
    rest: afterRest,
  });
  return analyser;
}

/** Judges what is on the bench over the subject's cases, gesture under way included. */
export function useOverCases({ conditions, opened }: BenchSubject, store: DraftStore): OverCases {
  const analyser = useMemo(() => createCasesAnalyser({ conditions, opened }), [conditions, opened]);
  useEffect(() => {
    const ask = () => analyser.ask(current(store.getState()));
    ask();
    const leave = store.subscribe(ask);
    return () => {
      leave();
      analyser.stop();
    };
  }, [analyser, store]);
  return useMemo(() => createReadings(analyser), [analyser]);
}
