import { useMemo, useSyncExternalStore } from 'react';
import type { ChartLimits } from '@/components/charts';
import type { FrequencyResponse } from '@/contract';
import { chartLimits } from '@/figures';
import { useBench } from '../bench-context';

/** What is demanded of the loop, as the charts draw it. */
export function useDemands(): ChartLimits {
  const { conditions, opened } = useBench().subject;
  const actuator = opened?.actuator ?? null;
  return useMemo(() => chartLimits(conditions.limits, actuator), [conditions, actuator]);
}

/** The curves over frequency of every case but the one that is shown, drawn thin as they last rested; undefined until they are there. */
export function useOtherCurves(): readonly FrequencyResponse[] | undefined {
  const { over, subject } = useBench();
  const rested = useSyncExternalStore(over.subscribe, () => over.get().rested);
  const shown = subject.shownCase.id;
  return useMemo(() => rested?.curves.filter((_, index) => rested.results[index].case.id !== shown), [rested, shown]);
}
