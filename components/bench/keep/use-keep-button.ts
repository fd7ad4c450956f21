import { useSignal } from '@/hooks/use-signal';
import { useBench, useDraft } from '../bench-context';
import { isMoved } from '../draft/draft';
import { isOvertaken } from '../draft/meet-latest';
import { nextRevision, whyNotKept } from './saved-words';

export interface KeepButton {
  /** false for those who may never keep here: they are told why, and offered nothing to press. */
  readonly offered: boolean;
  readonly revision: number;
  readonly disabled: boolean;
  /** Why it cannot be pressed, or what pressing it needs; null where there is nothing to say. */
  readonly remark: string | null;
}

/** Whether the bench can be kept now, as which revision, and if not why; said before it is pressed. */
export function useKeepButton(): KeepButton {
  const { subject } = useBench();
  const online = useSignal();
  const latest = subject.latest?.revision ?? null;
  const nothingToKeep = useDraft((draft) => draft.base.revision !== null && !isMoved(draft));
  const overtaken = useDraft((draft) => isOvertaken(draft, latest));
  const revision = nextRevision(latest);
  const refused = whyNotKept(subject.project);
  const remark = refused ?? (online ? null : 'No signal. The draft stays on this device; keeping it needs signal.');
  return { offered: refused === null, revision, disabled: remark !== null || nothingToKeep || overtaken, remark };
}
