import { forget, keep, recall } from '@/hooks/device-store';
import { emptyPlantForm, type PlantForm } from './plant-form';

/** What was typed and not kept, and on which revision it was begun (0: a plant that does not exist yet). */
export interface PlantDraft {
  base: number;
  form: PlantForm;
}

const keyOf = (projectId: string, plantId: string | undefined) => `draft.plant.${projectId}.${plantId ?? 'new'}`;

const isForm = (value: unknown): value is PlantForm =>
  typeof value === 'object' &&
  value !== null &&
  Object.entries(emptyPlantForm).every(([field, empty]) => typeof (value as Record<string, unknown>)[field] === typeof empty);

/** The draft of a plant on this device; what an older version kept otherwise is left alone. */
export function recallPlantDraft(projectId: string, plantId?: string): PlantDraft | null {
  const kept = recall(keyOf(projectId, plantId));
  if (typeof kept !== 'object' || kept === null) return null;
  const { base, form } = kept as Record<string, unknown>;
  const filled = { ...emptyPlantForm, ...(form as object) };
  return typeof base === 'number' && isForm(filled) ? { base, form: filled } : null;
}

export const keepPlantDraft = (projectId: string, plantId: string | undefined, draft: PlantDraft): void =>
  keep(keyOf(projectId, plantId), draft);

export const forgetPlantDraft = (projectId: string, plantId?: string): void => forget(keyOf(projectId, plantId));
