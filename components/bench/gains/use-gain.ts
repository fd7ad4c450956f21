import { useCallback } from 'react';
import { useBench, useDraft } from '../bench-context';
import { clampGain, type Gain, gainUnit, nudged, roundedGain } from '../draft/gain';
import { current } from '../draft/draft';

export interface GainControl {
  readonly value: number;
  readonly kept: number;
  readonly moved: boolean;
  readonly unit: string;
  /** Follows the finger. */
  hold(value: number): void;
  /** The finger lifts. */
  release(): void;
  /** One whole gesture to a value. */
  set(value: number): void;
  /** One whole gesture by a fraction of the gain. */
  nudge(fraction: number): void;
}

/** One gain of the draft, and the ways to move it. */
export function useGain(gain: Gain): GainControl {
  const { store, subject } = useBench();
  const value = useDraft((draft) => current(draft)[gain]);
  const kept = useDraft(({ base }) => base.settings[gain]);
  const hold = useCallback((next: number) => store.getState().hold({ [gain]: clampGain(gain, roundedGain(next)) }), [store, gain]);
  const release = useCallback(() => store.getState().release(), [store]);
  const set = useCallback((next: number) => store.getState().move({ [gain]: clampGain(gain, next) }), [store, gain]);
  const nudge = useCallback(
    (fraction: number) => {
      const draft = store.getState();
      draft.move({ [gain]: nudged(gain, current(draft), draft.base.settings, fraction) });
    },
    [store, gain],
  );
  return { value, kept, moved: value !== kept, unit: gainUnit(gain, subject.plant.units), hold, release, set, nudge };
}
