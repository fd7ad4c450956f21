import { current, type Draft } from './draft';
import type { DraftState } from './draft-store';
import { writtenIn } from './form';
import { type Gain, nudged } from './gain';

/** The kept value of a gain, written in the form on the bench; null where that form cannot say it or has no integral action. */
export function keptGain(draft: Draft, gain: Gain): number | null {
  const kept = writtenIn(current(draft).form, draft.base.settings);
  return 'refusal' in kept ? null : kept.gains[gain];
}

/** Moves a gain of the draft by a fraction, in one gesture; without integral action Ti stays away. */
export function nudgeGain(draft: DraftState, gain: Gain, fraction: number): void {
  const value = nudged({ gain, settings: current(draft), kept: keptGain(draft, gain), fraction });
  if (value !== null) draft.move({ [gain]: value });
}
