import { temporal } from 'zundo';
import { createStore } from 'zustand/vanilla';
import { type Draft, freshDraft, held, isMoved, keptAs, type KeptBase, moved, type Place, rebased, released } from './draft';
import { forgetDraft, readDraft, type Storage, writeDraft } from './draft-storage';
import { meetLatest } from './meet-latest';
import type { Settings } from './settings';

export interface DraftState extends Draft {
  /** false where this device refused to write the draft: it then lives in this page alone. */
  readonly stored: boolean;
  /** Follows the finger; joins the history at `release`. */
  hold(patch: Partial<Settings>): void;
  release(): void;
  /** One whole gesture. */
  move(patch: Partial<Settings>): void;
  setNote(note: string): void;
  /** The settings sent were kept as this base. */
  keep(base: KeptBase): void;
  /** The same settings, on top of a newer base. */
  rebase(base: KeptBase): void;
  /** The base's settings; the draft can be had back by undo. */
  take(base: KeptBase): void;
}

const STEPS = 100;
const samePlace = (a: Place, b: Place) => a.step === b.step && a.settings === b.settings;

interface DraftStoreOptions {
  readonly key: string;
  readonly latest: KeptBase;
  readonly storage: Storage | null;
}

/**
 * The draft of one design on this device, with 100 steps of undo and redo in `store.temporal`. What was stored under `key` is
 * taken up again; every finished gesture is stored at once, and a draft that equals its base is forgotten.
 */
export function createDraftStore({ key, latest, storage }: DraftStoreOptions) {
  const found = readDraft(storage, key);
  const start = found === null ? freshDraft(latest) : meetLatest(found.draft, latest);
  const resumed = found !== null && start === found.draft;

  const store = createStore<DraftState>()(
    temporal(
      (set) => ({
        ...start,
        stored: true,
        hold: (patch) => set((draft) => held(draft, patch)),
        release: () => set(released),
        move: (patch) => set((draft) => moved(draft, patch)),
        setNote: (note) => set({ note }),
        keep: (base) => set((draft) => keptAs(draft, base)),
        rebase: (base) => set((draft) => rebased(draft, base)),
        take: (base) => set((draft) => rebased(moved(draft, base.settings), base)),
      }),
      {
        limit: STEPS,
        partialize: ({ settings, step }): Place => ({ settings, step }),
        equality: samePlace,
        ...(resumed && { pastStates: [...found.past], futureStates: [...found.future] }),
      },
    ),
  );

  const save = () => {
    const draft = store.getState();
    if (!isMoved(draft) && draft.note === '') return forgetDraft(storage, key);
    const { pastStates, futureStates } = store.temporal.getState();
    const stored = writeDraft(storage, key, { draft, past: pastStates as Place[], future: futureStates as Place[] });
    if (stored !== draft.stored) store.setState({ stored });
  };
  store.temporal.subscribe(save);
  store.subscribe((draft, before) => {
    if (draft.base !== before.base || draft.note !== before.note) save();
  });
  if (found !== null && !resumed) save();
  return store;
}

export type DraftStore = ReturnType<typeof createDraftStore>;

/** A newer revision was seen: an unmoved draft follows it, with a history of its own; a moved one stays. */
export function meetNewest(store: DraftStore, newest: KeptBase): void {
  const draft = store.getState();
  const met = meetLatest(draft, newest);
  if (met === draft) return;
  store.setState(met);
  store.temporal.getState().clear();
}

/** Takes the last gesture back; one still under way is ended first, so that it is the one taken back. */
export function undo(store: DraftStore): void {
  store.getState().release();
  store.temporal.getState().undo();
}

export function redo(store: DraftStore): void {
  store.getState().release();
  store.temporal.getState().redo();
}
