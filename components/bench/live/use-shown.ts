import { useMemo, useSyncExternalStore } from 'react';
import type { ChartDesign } from '@/components/charts';
import { useBench, useReading } from '../bench-context';
import { asA, type Standing } from './use-standing';

/** A for charts over frequency: at this moment, or where it is not looked at as it last rested. What calls this is rendered with every move. */
export function useShownLoop({ rested }: Standing, moving = true): ChartDesign | null {
  const { analyser } = useBench();
  const output = useSyncExternalStore(analyser.subscribe, () => (moving ? analyser.get().output : null));
  const now = useMemo(() => asA(output), [output]);
  return moving ? now : rested;
}

/** A for charts over time: its responses come beside the curves over frequency, and at rest are drawn in full until the axes' end. */
export function useShownResponses({ rested }: Standing, moving = true): ChartDesign | null {
  const { analyser } = useBench();
  const complete = useSyncExternalStore(analyser.subscribe, () => (moving ? analyser.get().complete : null));
  const now = useMemo(() => asA(complete), [complete]);
  return moving && complete?.loop !== rested?.loop ? now : rested;
}

/** A for what is read of it over frequency. */
export function useReadLoop(): ChartDesign | null {
  const { output } = useReading();
  return useMemo(() => asA(output), [output]);
}

/** A for what is read of its responses. */
export function useReadResponses({ rested }: Standing): ChartDesign | null {
  const { complete } = useReading();
  const now = useMemo(() => asA(complete), [complete]);
  return complete?.loop !== rested?.loop ? now : rested;
}
