import { useEffect, useState } from 'react';
import { useAnnounce } from '@/components/ui/announcements';
import { useUnits } from '@/components/ui/units';
import type { Case, PlantRevision } from '@/contract';
import { ApiProblem, hasStatus, sentence } from '@/hooks/api/problem';
import { useCreateCase, useUpdateCase } from '@/hooks/queries/cases';
import { forgetCaseDraft, keepCaseDraft, recallCaseDraft } from './case-draft';
import { caseForm, type CaseForm, emptyCaseForm } from './case-form';
import { type CaseErrors, fieldOfPointer, readCaseForm } from './read-case-form';

interface Editing {
  readonly projectId: string;
  /** Names the draft: the case's id, or "new". */
  readonly what: string;
  readonly kept: Case | undefined;
  readonly plants: readonly PlantRevision[];
  /** The case was kept or made. */
  readonly onDone: (caseId: string) => void;
}

const saidBy = (error: Error | null): CaseErrors =>
  error instanceof ApiProblem
    ? Object.fromEntries((error.details.errors ?? []).map(({ pointer, detail }) => [fieldOfPointer(pointer), detail]))
    : {};

/** The editor of one case, or of a case to be: its fields, its draft on this device, keeping, and what to do when someone else was first. */
export function useCaseEditor({ projectId, what, kept, plants, onDone }: Editing) {
  const { speed } = useUnits();
  const [start] = useState(() => recallCaseDraft(projectId, what));
  const fresh = () => (kept ? caseForm(kept, speed) : emptyCaseForm(plants[plants.length - 1]?.id ?? '', speed));
  const [form, setForm] = useState<CaseForm>(() => start?.form ?? fresh());
  const [base, setBase] = useState(start ? start.base : (kept?.etag ?? null));
  const [tried, setTried] = useState(false);
  const plant = plants.find(({ id }) => id === form.plantId);
  const { content, errors } = readCaseForm(form, plant);
  const original = kept ? caseForm(kept, form.speedUnit) : emptyCaseForm(form.plantId, form.speedUnit);
  const changed = JSON.stringify(form) !== JSON.stringify(original);
  const overtaken = kept !== undefined && base !== null && kept.etag !== base;
  const gone = kept === undefined && base !== null;
  useEffect(() => {
    if (changed || overtaken) keepCaseDraft(projectId, what, { base, form });
    else forgetCaseDraft(projectId, what);
  }, [changed, overtaken, projectId, what, base, form]);

  const announce = useAnnounce();
  const create = useCreateCase(projectId);
  const update = useUpdateCase(projectId);
  const error = create.error ?? update.error;
  const done = {
    onSuccess: (made: Case) => {
      forgetCaseDraft(projectId, what);
      announce(`Kept the case ${made.name}.`);
      onDone(made.id);
    },
  };
  const type = (change: Partial<CaseForm>) => {
    create.reset();
    update.reset();
    setForm((before) => ({ ...before, ...change }));
  };
  const submit = () => {
    setTried(true);
    if (content === null || overtaken) return;
    if (kept) update.mutate({ id: kept.id, etag: base ?? kept.etag, changes: content }, done);
    else create.mutate(content, done);
  };
  const discard = () => {
    forgetCaseDraft(projectId, what);
    setForm(fresh());
    setBase(kept?.etag ?? null);
  };
  // What a field lacks is said once somebody tried to keep it; what stands in it wrongly is said at once.
  const shown = tried ? errors : Object.fromEntries(Object.entries(errors).filter(([field]) => field !== 'name' || form.name !== ''));
  return {
    form,
    plant,
    type,
    submit,
    discard,
    changed,
    errors: { ...shown, ...saidBy(error) },
    busy: create.isPending || update.isPending,
    problem: error && !hasStatus(error, 412) ? sentence(error) : null,
    /** Somebody changed the case after the version that this was begun on; theirs is what is kept now. */
    theirs: overtaken ? original : null,
    gone,
    adopt: () => setBase(kept?.etag ?? null),
  };
}
