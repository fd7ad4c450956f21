import { useEffect, useMemo } from 'react';
import type { ChartDesign } from '@/components/charts';
import { useAnswer, useBench, useRestedAnswer } from '../bench-context';
import type { Compared } from '../compare/use-compared';
import { settingsOf } from '../draft/settings';
import type { StepSizes } from './bench-loop';
import { answerUntil, type LoopAnswer } from './loop-answer';
import { type TimeEnds, timeEnds } from './time-ends';
import { useSettledAnalysis } from './use-bench-analysis';

export interface Designs {
  /** What is on the bench; null before the first answer. */
  readonly a: ChartDesign | null;
  /** A with its responses, which follow a frame later, until the axes' end; null before there are any. */
  readonly timed: ChartDesign | null;
  /** A as it stood when it last rested. */
  readonly rested: ChartDesign | null;
  readonly b: ChartDesign | undefined;
  /** Null before A rested for the first time. */
  readonly ends: TimeEnds | null;
}

const LABEL = 'A, now';

/** A, which is on the bench, and B, which was kept and lies beside it, as the charts take them. */
export function useDesigns({ revision }: Compared, steps: StepSizes): Designs {
  const { subject, lookedAt } = useBench();
  const { output, complete, detail } = useAnswer();
  const still = useRestedAnswer();
  const settings = useMemo(() => (revision === null ? null : settingsOf(revision)), [revision]);
  const beside = useSettledAnalysis(subject, settings, steps);
  const ends = useMemo(
    () => (still === null ? null : timeEnds([still, ...(beside === null ? [] : [beside])].map(({ analysis }) => analysis))),
    [still, beside],
  );
  useEffect(() => {
    lookedAt.set({ end: ends?.both ?? null });
  }, [lookedAt, ends]);

  const a = useMemo(() => (output === null ? null : { label: LABEL, ...output }), [output]);
  const rested = useMemo(() => (still === null ? null : { label: LABEL, ...lastingUntil(still, ends) }), [still, ends]);
  const moving = useMemo(() => (complete === null ? null : { label: LABEL, ...complete }), [complete]);
  const b = useMemo(
    () => (beside === null || revision === null ? undefined : { label: `B, rev ${revision.revision}`, ...lastingUntil(beside, ends) }),
    [beside, revision, ends],
  );
  return { a, timed: detail === 'full' ? rested : moving, rested, b, ends };
}

const lastingUntil = (answer: LoopAnswer, ends: TimeEnds | null): LoopAnswer => (ends === null ? answer : answerUntil(answer, ends.both));
