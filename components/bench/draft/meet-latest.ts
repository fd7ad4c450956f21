import { type Draft, freshDraft, isMoved, type KeptBase } from './draft';
import { sameSettings } from './settings';

/**
 * What becomes of a draft when the newest kept revision is `latest`.
 *
 * A draft that equals the newest is none, and an unmoved one follows it. One that was moved from an older revision stays as it
 * is: whoever moved it decides.
 */
export function meetLatest(draft: Draft, latest: KeptBase): Draft {
  if (draft.base.revision === latest.revision) return draft;
  const nothingOfItsOwn = !isMoved(draft) || sameSettings(draft.settings, latest.settings);
  return nothingOfItsOwn && draft.held === null ? { ...freshDraft(latest), note: draft.note } : draft;
}

/** True where a newer revision was kept than the one the draft was moved from. */
export const isOvertaken = (draft: Draft, latestRevision: number | null): boolean =>
  latestRevision !== null && (draft.base.revision ?? 0) < latestRevision;
