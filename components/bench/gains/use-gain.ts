import { useCallback, useMemo } from 'react';
import { gainUnit } from '@/figures';
import { useBench, useDraft } from '../bench-context';
import { current } from '../draft/draft';
import { sameGain } from '../draft/form';
import { clampGain, type Gain, gainWords, roundedGain } from '../draft/gain';
import { keptGain, nudgeGain } from '../draft/move-gain';
import type { Form } from '../draft/settings';

export interface GainControl {
  readonly form: Form;
  /** null: there is no integral action. */
  readonly value: number | null;
  /** What was kept, written in the form that is on the bench; null where that form cannot say it. */
  readonly kept: number | null;
  readonly moved: boolean;
  readonly unit: string;
  /** Follows the finger. */
  hold(value: number): void;
  /** The finger lifts. */
  release(): void;
  /** One whole gesture to a value that was read. */
  set(value: number): void;
  /** One whole gesture by a fraction of the gain. */
  nudge(fraction: number): void;
}

/** One gain of the draft, and the ways to move it. */
export function useGain(gain: Gain): GainControl {
  const { store, subject } = useBench();
  const form = useDraft((draft) => current(draft).form);
  const value = useDraft((draft) => current(draft)[gain]);
  const kept = useDraft((draft) => keptGain(draft, gain));
  const ways = useMemo(
    () => ({
      hold: (next: number) => store.getState().hold({ [gain]: clampGain(gain, form, roundedGain(next)) }),
      release: () => store.getState().release(),
      set: (next: number) => store.getState().move({ [gain]: next }),
    }),
    [store, gain, form],
  );
  const nudge = useCallback((fraction: number) => nudgeGain(store.getState(), gain, fraction), [store, gain]);
  const unit = gainUnit(gainWords(gain, form).label, subject.plant.units);
  return { form, value, kept, moved: !sameGain(value, kept), unit, ...ways, nudge };
}
