import { useEffect, useState } from 'react';
import { useAnnounce } from '@/components/ui/announcements';
import { useUnits } from '@/components/ui/units';
import { ApiProblem, sentence } from '@/hooks/api/problem';
import { forget, keep, recall } from '@/hooks/device-store';
import { useCreateGrid } from '@/hooks/queries/cases';
import type { Axis, PlantRevision } from '@/contract';
import { countOf } from '../analyse-again';
import { type AxisForm, emptyGridForm, type GridForm, isGridForm } from './grid-form';
import { readGridForm } from './read-grid-form';

interface Editing {
  readonly projectId: string;
  readonly plants: readonly PlantRevision[];
  /** Cases that there are. */
  readonly caseCount: number;
  readonly onDone: (caseId?: string) => void;
}

const keyOf = (projectId: string) => `draft.grid.${projectId}`;

function recallForm(projectId: string): GridForm | null {
  const kept = recall(keyOf(projectId));
  return isGridForm(kept) ? kept : null;
}

/** Every sentence of a refusal, since what it means may stand in the middle of a list. */
const detailsOf = (error: Error): string =>
  error instanceof ApiProblem && error.details.errors?.length
    ? [...new Set(error.details.errors.map(({ detail }) => detail))].join(' ')
    : sentence(error);

/** The editor of a grid of cases: its lists, their draft on this device, and making the cases. */
export function useGridEditor({ projectId, plants, caseCount, onDone }: Editing) {
  const { speed } = useUnits();
  const fresh = () => emptyGridForm(plants[plants.length - 1]?.id ?? '', speed);
  const [form, setForm] = useState<GridForm>(() => recallForm(projectId) ?? fresh());
  const [tried, setTried] = useState(false);
  const plant = plants.find(({ id }) => id === form.plantId);
  const read = readGridForm(form, plant, caseCount);
  const changed = Object.values(form.axes).some(({ at, rows }) => at !== '' || rows.length > 0);
  useEffect(() => {
    if (changed) keep(keyOf(projectId), form);
    else forget(keyOf(projectId));
  }, [changed, projectId, form]);
  const announce = useAnnounce();
  const create = useCreateGrid(projectId);
  const change = (next: Partial<GridForm>) => {
    create.reset();
    setForm((before) => ({ ...before, ...next }));
  };
  const submit = () => {
    setTried(true);
    if (read.lists === null || read.lists.length === 0) return;
    const plantRevision = form.plantRevision === '' ? null : Number(form.plantRevision);
    create.mutate(
      { plantId: form.plantId, plantRevision, lists: [...read.lists], replace: form.replace },
      {
        onSuccess: ({ items }) => {
          forget(keyOf(projectId));
          announce(`Made ${countOf(items.length)}.`);
          onDone(items[0]?.id);
        },
      },
    );
  };
  const { lists: nothing, ...wrong } = read.errors;
  return {
    form,
    plant,
    counts: read.counts,
    lists: read.lists,
    errors: tried && nothing ? read.errors : wrong,
    changed,
    change,
    changeAxis: (axis: Axis, next: AxisForm) => change({ axes: { ...form.axes, [axis]: next } }),
    submit,
    empty: () => {
      forget(keyOf(projectId));
      setForm(fresh());
      setTried(false);
    },
    busy: create.isPending,
    problem: create.error ? detailsOf(create.error) : null,
  };
}
