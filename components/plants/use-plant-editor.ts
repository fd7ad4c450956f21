import { useEffect, useState } from 'react';
import { type FieldErrors, type FieldPath, type Resolver, set, useForm, useWatch } from 'react-hook-form';
import { useAnnounce } from '@/components/ui/announcements';
import type { PlantRevision } from '@/contract';
import { ApiProblem, hasStatus, sentence } from '@/hooks/api/problem';
import { useCreatePlant, useRevisePlant } from '@/hooks/queries/plants';
import { forgetPlantDraft, keepPlantDraft, recallPlantDraft } from './plant-draft';
import { useNotation } from './notation/use-notation';
import { emptyPlantForm, hasTyped, isChanged, type PlantForm, plantForm } from './plant-form';
import { fieldOf, readPlantForm } from './read-plant-form';
import { usePreview } from './use-preview';

const resolver: Resolver<PlantForm> = (form) => {
  const said: FieldErrors<PlantForm> = {};
  for (const [field, message] of Object.entries(readPlantForm(form).errors)) set(said, field, { type: 'read', message });
  return Object.keys(said).length > 0 ? { values: {}, errors: said } : { values: form, errors: {} };
};

/** The editor of one plant, or of a plant to be: its form, its preview, its draft on this device, and keeping. */
export function usePlantEditor(projectId: string, latest: PlantRevision | undefined) {
  const plantId = latest?.id;
  const [start] = useState(() => {
    const kept = latest ? plantForm(latest) : emptyPlantForm;
    return { kept, draft: recallPlantDraft(projectId, plantId), revision: latest?.revision ?? 0 };
  });
  const [base, setBase] = useState(start.draft?.base ?? start.revision);
  const { control, getValues, handleSubmit, reset, setError } = useForm<PlantForm>({
    resolver,
    mode: 'onChange',
    defaultValues: start.draft?.form ?? start.kept,
  });
  const form = useWatch({ control }) as PlantForm;
  const preview = usePreview(form, latest);
  const notation = useNotation({ form, read: getValues, write: (next) => reset(next, { keepDefaultValues: true }), shown: preview.plant });
  const typed = hasTyped(form, start.kept);
  useEffect(() => {
    if (typed) keepPlantDraft(projectId, plantId, { base, form });
    else forgetPlantDraft(projectId, plantId);
  }, [typed, projectId, plantId, base, form]);

  const create = useCreatePlant(projectId);
  const revise = useRevisePlant(projectId, plantId ?? '');
  const announce = useAnnounce();
  const error = create.error ?? revise.error;
  const settle = {
    onSuccess: ({ revision }: PlantRevision) => {
      forgetPlantDraft(projectId, plantId);
      announce(`Kept as plant rev ${revision}.`);
    },
    onError: (problem: Error) => {
      if (!(problem instanceof ApiProblem)) return;
      for (const { pointer, detail } of problem.details.errors ?? []) {
        const field = fieldOf(pointer);
        if (field) setError(field as FieldPath<PlantForm>, { message: detail });
      }
    },
  };
  const submit = handleSubmit((values) => {
    const { content } = readPlantForm(values);
    if (!content) return;
    const body = { name: values.name.trim(), ...content, delayBudget: latest?.delayBudget ?? [], note: values.note.trim() || undefined };
    if (latest) revise.mutate({ ...body, baseRevision: base }, settle);
    else create.mutate(body, settle);
  });
  return {
    control,
    submit,
    form,
    notation,
    preview,
    changed: isChanged(form, start.kept),
    busy: create.isPending || revise.isPending,
    problem: error && !hasStatus(error, 409) ? sentence(error) : null,
    /** Somebody kept a revision after the one that this was begun on. */
    overtaken: latest !== undefined && (latest.revision > base || hasStatus(error, 409)),
    adopt: () => setBase(latest?.revision ?? 0),
    discard: () => {
      forgetPlantDraft(projectId, plantId);
      reset(latest ? plantForm(latest) : emptyPlantForm);
      setBase(latest?.revision ?? 0);
    },
  };
}
