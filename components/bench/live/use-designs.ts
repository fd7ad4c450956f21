import { useMemo } from 'react';
import type { ChartDesign } from '@/components/charts';
import { useAnswer, useBench } from '../bench-context';
import { settingsOf } from '../draft/settings';
import type { Compared } from '../compare/use-compared';
import type { StepSizes } from './bench-loop';
import { useSettledAnalysis } from './use-bench-analysis';

export interface Designs {
  /** What is on the bench; null before the first answer. */
  readonly a: ChartDesign | null;
  readonly b: ChartDesign | undefined;
}

/** A, which is on the bench, and B, which was kept and lies beside it, as the charts take them. */
export function useDesigns({ revision }: Compared, steps: StepSizes): Designs {
  const { subject } = useBench();
  const { output } = useAnswer();
  const settings = useMemo(() => (revision === null ? null : settingsOf(revision)), [revision]);
  const beside = useSettledAnalysis(subject, settings, steps);
  const a = useMemo(() => (output === null ? null : { label: 'A, now', ...output }), [output]);
  const b = useMemo(
    () => (beside === null || revision === null ? undefined : { label: `B, rev ${revision.revision}`, ...beside }),
    [beside, revision],
  );
  return { a, b };
}
