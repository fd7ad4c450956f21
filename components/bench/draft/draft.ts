import { sameSettings, type Settings } from './settings';

/** A revision that was kept; `revision` is null while the design has none. */
export interface KeptBase {
  readonly revision: number | null;
  readonly settings: Settings;
}

/** A place in the row of gestures: `step` counts them, so that undoing one counts back. */
export interface Place {
  readonly settings: Settings;
  readonly step: number;
}

/** Settings that are being moved, what they were moved from, and the gesture that is under way. */
export interface Draft extends Place {
  readonly base: KeptBase;
  /** The `step` at which the base was kept. */
  readonly baseStep: number;
  /** What the finger holds now; null while nothing is held. It joins the history when the finger lifts. */
  readonly held: Settings | null;
  readonly note: string;
}

export const freshDraft = (base: KeptBase): Draft => ({ base, baseStep: 0, settings: base.settings, step: 0, held: null, note: '' });

/** What is on the bench this moment, the gesture under way included. */
export const current = (draft: Draft): Settings => draft.held ?? draft.settings;

export const held = (draft: Draft, patch: Partial<Settings>): Draft => ({ ...draft, held: { ...current(draft), ...patch } });

/** Ends the gesture: one step of history, or none where it came back to where it began. */
export function released(draft: Draft): Draft {
  if (draft.held === null) return draft;
  if (sameSettings(draft.held, draft.settings)) return { ...draft, held: null };
  return { ...draft, settings: draft.held, step: draft.step + 1, held: null };
}

export const moved = (draft: Draft, patch: Partial<Settings>): Draft => released(held(draft, patch));

/** The draft after its settings were kept as `revision`. What was moved while the answer was under way stays a draft. */
export const keptAs = (draft: Draft, base: KeptBase): Draft => ({ ...draft, base, baseStep: draft.step, note: '' });

/** The same settings on a newer base. */
export const rebased = (draft: Draft, base: KeptBase): Draft => ({ ...draft, base });

export const isMoved = (draft: Draft): boolean => !sameSettings(current(draft), draft.base.settings);

/** Gestures since the base was kept; 0 where the settings are the base's, whichever way they came there. */
export function movesSinceKept(draft: Draft): number {
  if (!isMoved(draft)) return 0;
  return Math.max(1, Math.abs(draft.step - draft.baseStep));
}
