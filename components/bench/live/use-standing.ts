import { useEffect, useMemo } from 'react';
import type { ChartDesign } from '@/components/charts';
import { useBench, useRestedAnswer } from '../bench-context';
import type { Compared } from '../compare/use-compared';
import { settingsOf } from '../draft/settings';
import type { StepSizes } from './bench-loop';
import type { LoopAnswer } from './loop-answer';
import { type TimeEnds, timeEnds } from './time-ends';
import { useSettledAnalysis } from './use-bench-analysis';
import { useLonger } from './use-longer';

/** A loop's answer as the charts take it. */
export type LabelledAnswer = ChartDesign & LoopAnswer;

/** What stands still while a gain moves. */
export interface Standing {
  /** A as it stood when it last rested, its responses until the axes' end; null before. */
  readonly rested: LabelledAnswer | null;
  /** B, which was kept and lies beside A. */
  readonly b: ChartDesign | undefined;
  /** Null before A rested for the first time. */
  readonly ends: TimeEnds | null;
}

export const NAME_OF_A = 'A, now';

/** Answers of A under its name. */
export const asA = (answer: LoopAnswer | null): LabelledAnswer | null => answer && { label: NAME_OF_A, ...answer };

/** What A and B are at rest, and where their time axes end. */
export function useStanding({ revision }: Compared, steps: StepSizes): Standing {
  const { subject, lookedAt } = useBench();
  const still = useRestedAnswer();
  const settings = useMemo(() => (revision === null ? null : settingsOf(revision)), [revision]);
  const beside = useSettledAnalysis(subject, settings, steps);
  const ends = useMemo(
    () => (still === null ? null : timeEnds([still, ...(beside === null ? [] : [beside])].map(({ analysis }) => analysis))),
    [still, beside],
  );
  const end = ends?.both ?? null;
  useEffect(() => {
    lookedAt.set({ end });
  }, [lookedAt, end]);
  const longStill = useLonger(still, end);
  const longBeside = useLonger(beside, end);
  const rested = useMemo(() => asA(longStill), [longStill]);
  const name = revision && `B, rev ${revision.revision}`;
  const b = useMemo(() => (name === null || longBeside === null ? undefined : { label: name, ...longBeside }), [name, longBeside]);
  return useMemo(() => ({ rested, b, ends }), [rested, b, ends]);
}
