import { forget, keep, recall } from '@/hooks/device-store';
import { type CaseForm, isCaseForm } from './case-form';

/** What was typed and not kept, and the version of the case on which it was begun (null: a case to be). */
export interface CaseDraft {
  readonly base: string | null;
  readonly form: CaseForm;
}

const keyOf = (projectId: string, what: string) => `draft.case.${projectId}.${what}`;

/** The draft of a case on this device; what an older version kept otherwise is left alone. */
export function recallCaseDraft(projectId: string, what: string): CaseDraft | null {
  const kept = recall(keyOf(projectId, what));
  if (typeof kept !== 'object' || kept === null) return null;
  const { base, form } = kept as Record<string, unknown>;
  return (typeof base === 'string' || base === null) && isCaseForm(form) ? { base, form } : null;
}

export const keepCaseDraft = (projectId: string, what: string, draft: CaseDraft): void => keep(keyOf(projectId, what), draft);
export const forgetCaseDraft = (projectId: string, what: string): void => forget(keyOf(projectId, what));
