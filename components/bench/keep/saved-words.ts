import type { Project } from '@/contract';
import { allows } from '@/contract/permissions';
import { type Draft, isMoved, movesSinceKept } from '../draft/draft';

export interface SavedWords {
  readonly state: string;
  readonly detail: string;
}

/** Why nothing can be kept here by this person; null where it can. */
export function whyNotKept({ role, archived }: Pick<Project, 'role' | 'archived'>): string | null {
  if (!allows(role, 'edit')) return `You are a ${role} here: move the gains, an editor keeps them.`;
  return archived ? 'An archived project keeps nothing new.' : null;
}

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
