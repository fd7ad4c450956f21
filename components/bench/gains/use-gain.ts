import { useCallback, useMemo } from 'react';
import { gainUnit } from '@/figures';
import { useBench, useDraft } from '../bench-context';
import { current, type Draft } from '../draft/draft';
import { sameGain, writtenIn } from '../draft/form';
import { clampGain, type Gain, gainWords, nudged, roundedGain } from '../draft/gain';
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
  /** One whole gesture to a value; null takes integral action away. */
  set(value: number | null): void;
  /** One whole gesture by a fraction of the gain. */
  nudge(fraction: number): void;
}

/** The kept value of a gain in the form on the bench. */
export function keptGain(draft: Draft, gain: Gain): number | null {
  const kept = writtenIn(current(draft).form, draft.base.settings);
  return 'refusal' in kept ? null : kept.gains[gain];
}

/** Moves a gain of the draft by a fraction, in one gesture. */
export function nudgeDraft(draft: Draft & { move(patch: Partial<Record<Gain, number>>): void }, gain: Gain, fraction: number): void {
  const settings = current(draft);
  const value = nudged({ gain, settings, kept: keptGain(draft, gain), fraction });
  if (value !== null) draft.move({ [gain]: value });
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
      set: (next: number | null) => store.getState().move({ [gain]: next === null ? null : clampGain(gain, form, next) }),
    }),
    [store, gain, form],
  );
  const nudge = useCallback((fraction: number) => nudgeDraft(store.getState(), gain, fraction), [store, gain]);
  const unit = gainUnit(gainWords(gain, form).label, subject.plant.units);
  return { form, value, kept, moved: !sameGain(value, kept), unit, ...ways, nudge };
}
