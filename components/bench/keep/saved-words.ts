import type { Role } from '@/contract';
import { type Draft, isMoved, movesSinceKept } from '../draft/draft';

export interface SavedWords {
  readonly state: string;
  readonly detail: string;
}

export const mayKeep = (role: Role): boolean => role === 'owner' || role === 'editor';

const counted = (moves: number): string => `${moves} ${moves === 1 ? 'move' : 'moves'}`;

/** What stands of the draft, in two short lines: whether it is kept, and what was moved since. `brief` leaves out since when. */
export function savedWords(draft: Draft, brief = false): SavedWords {
  const { revision } = draft.base;
  if (revision === null) {
    const moves = movesSinceKept(draft);
    return { state: 'Not kept', detail: moves === 0 ? 'no design yet' : counted(moves) };
  }
  if (!isMoved(draft)) return { state: 'Kept', detail: `rev ${revision}` };
  return { state: 'Not kept', detail: counted(movesSinceKept(draft)) + (brief ? '' : ` since rev ${revision}`) };
}

/** The revision that keeping would make; counted from the newest one, not from the one that the draft was moved from. */
export const nextRevision = (latestRevision: number | null): number => (latestRevision ?? 0) + 1;
