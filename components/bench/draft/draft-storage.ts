import { z } from 'zod';
import { Filter } from '@/contract';
import type { Draft, Place } from './draft';

/** A draft as this device keeps it: with its history, so that a gain moved by mistake can be taken back after a reload too. */
export interface StoredDraft {
  readonly draft: Draft;
  readonly past: readonly Place[];
  readonly future: readonly Place[];
}

const finite = z.number();
const StoredSettings = z.object({
  form: z.enum(['parallel', 'ideal', 'series']),
  kp: finite,
  integral: finite.nullable(),
  derivative: finite,
  filterTime: finite,
  proportionalWeight: finite,
  derivativeWeight: finite,
  feedforward: finite,
  filters: z.array(Filter),
  statedContinuous: z.boolean(),
});
const StoredPlace = z.object({ settings: StoredSettings, step: z.int() });
/** Raised where the shape changes: a draft of another shape would be read wrongly, and is none. */
const VERSION = 2;
const Stored = z.object({
  version: z.literal(VERSION),
  base: z.object({ revision: z.int().nullable(), settings: StoredSettings }),
  baseStep: z.int(),
  place: StoredPlace,
  note: z.string(),
  past: z.array(StoredPlace),
  future: z.array(StoredPlace),
});

export type Storage = Pick<globalThis.Storage, 'getItem' | 'setItem' | 'removeItem'>;

export const draftKey = (projectId: string, designId: string | null): string => `kerbline.draft.${projectId}.${designId ?? 'new'}`;

/** The draft under `key`; null where there is none, where it cannot be read, or where it is not one of ours. */
export function readDraft(storage: Storage | null, key: string): StoredDraft | null {
  try {
    const { base, baseStep, place, note, past, future } = Stored.parse(JSON.parse(storage?.getItem(key) ?? 'null'));
    return { draft: { base, baseStep, ...place, held: null, note }, past, future };
  } catch {
    return null;
  }
}

/** Writes the draft; answers false where this device refuses (private window, full, forbidden), so that the screen can say so. */
export function writeDraft(storage: Storage | null, key: string, { draft, past, future }: StoredDraft): boolean {
  const { base, baseStep, settings, step, note } = draft;
  try {
    if (storage === null) return false;
    storage.setItem(key, JSON.stringify({ version: VERSION, base, baseStep, place: { settings, step }, note, past, future }));
    return true;
  } catch {
    return false;
  }
}

export function forgetDraft(storage: Storage | null, key: string): void {
  try {
    storage?.removeItem(key);
  } catch {
    // A device that refuses to write has kept nothing either.
  }
}

/** This device's storage; null where asking for it is already refused. */
export function deviceStorage(): Storage | null {
  try {
    return globalThis.localStorage ?? null;
  } catch {
    return null;
  }
}
