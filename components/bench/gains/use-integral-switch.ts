import { useCallback } from 'react';
import { useBench, useDraft } from '../bench-context';
import { current } from '../draft/draft';
import { keptGain } from '../draft/move-gain';
import { lastIntegralTime, startIntegralTime } from '../draft/integral-time';

export interface IntegralSwitch {
  /** false in parallel form, where Ki = 0 says it. */
  readonly offered: boolean;
  readonly on: boolean;
  turn(on: boolean): void;
}

/** Takes integral action away from a controller that is written with times, and gives it back as it was. */
export function useIntegralSwitch(): IntegralSwitch {
  const { store, analyser } = useBench();
  const form = useDraft((draft) => current(draft).form);
  const on = useDraft((draft) => current(draft).integral !== null);
  const turn = useCallback(
    (next: boolean) => {
      const draft = store.getState();
      if (!next) return draft.move({ integral: null });
      const crossover = analyser.get().output?.analysis.margins.phase?.frequency;
      const past = store.temporal.getState().pastStates.flatMap(({ settings }) => settings ?? []);
      draft.move({ integral: lastIntegralTime(past, current(draft).form) ?? keptGain(draft, 'integral') ?? startIntegralTime(crossover) });
    },
    [store, analyser],
  );
  return { offered: form !== 'parallel', on, turn };
}
