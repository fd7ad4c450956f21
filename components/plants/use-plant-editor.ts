import { useDeferredValue, useEffect, useMemo, useState } from 'react';
import { type FieldErrors, type Resolver, useForm, useWatch } from 'react-hook-form';
import { useAnnounce } from '@/components/ui/announcements';
import type { PlantContent, PlantRevision } from '@/contract';
import { ApiProblem, hasStatus, sentence } from '@/hooks/api/problem';
import { useCreatePlant, useRevisePlant } from '@/hooks/queries/plants';
import { forgetPlantDraft, keepPlantDraft, recallPlantDraft } from './plant-draft';
import { emptyPlantForm, fieldOf, type PlantForm, plantForm, readPlantForm } from './plant-form';

const resolver: Resolver<PlantForm> = (form) => {
  const { errors } = readPlantForm(form);
  const said = Object.entries(errors).map(([field, message]) => [field, { type: 'read', message }]);
  return said.length > 0 ? { values: {}, errors: Object.fromEntries(said) as FieldErrors<PlantForm> } : { values: form, errors: {} };
};

/** The plant that the fields describe, as far as they can be read: the last one that could be stays. */
function usePreview(form: PlantForm, before: PlantContent['plant'] | null): PlantContent['plant'] | null {
  const text = useDeferredValue(`${form.numerator}\n${form.denominator}\n${form.deadTime}`);
  const [last, setLast] = useState(before);
  const plant = useMemo(() => {
    const [numerator, denominator, deadTime] = text.split('\n');
    return readPlantForm({ ...emptyPlantForm, numerator, denominator, deadTime }).content?.plant ?? null;
  }, [text]);
  if (plant && plant !== last) setLast(plant);
  return plant ?? last;
}

/** The editor of one plant, or of a plant to be: its form, its preview, its draft on this device, and keeping. */
export function usePlantEditor(projectId: string, latest: PlantRevision | undefined) {
  const plantId = latest?.id;
  const [start] = useState(() => {
    const kept = latest ? plantForm(latest) : emptyPlantForm;
    return { kept, draft: recallPlantDraft(projectId, plantId), revision: latest?.revision ?? 0 };
  });
  const [base, setBase] = useState(start.draft?.base ?? start.revision);
  const { control, handleSubmit, reset, setError } = useForm<PlantForm>({
    resolver,
    mode: 'onChange',
    defaultValues: start.draft?.form ?? start.kept,
  });
  const form = useWatch({ control }) as PlantForm;
  const changed = (Object.keys(emptyPlantForm) as (keyof PlantForm)[]).some((field) => form[field] !== start.kept[field]);
  useEffect(() => {
    if (changed) keepPlantDraft(projectId, plantId, { base, form });
    else forgetPlantDraft(projectId, plantId);
  }, [changed, projectId, plantId, base, form]);

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
        if (field) setError(field, { message: detail });
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
    preview: usePreview(form, latest?.plant ?? null),
    changed,
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
