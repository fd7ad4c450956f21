import type { PlantContent } from '@/contract';
import { type FieldErrors, readNotation } from './notation/read-notation';
import { readTime } from './notation/read-time';
import type { PlantForm } from './plant-form';

const fields: Readonly<Record<string, string>> = {
  '/name': 'name',
  '/plant': 'denominator',
  '/sensor/timeConstant': 'sensorLag',
  '/sensor/deadTime': 'sensorDeadTime',
};
const ofPlant = new Set(['numerator', 'denominator', 'gain', 'zeros', 'poles', 'deadTime']);

/** The field that a JSON Pointer of the server means. What it says of a formula, the live reading has said already. */
export function fieldOf(pointer: string): string | undefined {
  const inPlant = /^\/plant\/(\w+)/.exec(pointer)?.[1];
  return fields[pointer] ?? (inPlant !== undefined && ofPlant.has(inPlant) ? inPlant : undefined);
}

export interface ReadPlantForm {
  /** The plant, where every field that makes it can be read. */
  content: PlantContent | null;
  errors: FieldErrors;
}

/** Reads the editor's fields: the plant they describe, and at each field that does not what is wrong with it. */
export function readPlantForm(form: PlantForm): ReadPlantForm {
  const { plant, errors: wrong } = readNotation(form, form.notation);
  const errors: FieldErrors = form.name.trim() === '' ? { name: 'A name has at least one character.', ...wrong } : { ...wrong };
  const timeIn = (field: 'sensorLag' | 'sensorDeadTime', name: string): number | null => {
    const read = readTime(form[field], name);
    if (typeof read === 'number') return read;
    errors[field] = read;
    return null;
  };
  const timeConstant = timeIn('sensorLag', 'The sensor’s lag');
  const deadTime = timeIn('sensorDeadTime', 'The sensor’s dead time');
  if (plant === null || timeConstant === null || deadTime === null) return { content: null, errors };
  const content: PlantContent = {
    plant,
    sensor: timeConstant > 0 || deadTime > 0 ? { timeConstant, deadTime } : null,
    deadTimeBasis: form.basis === 'unsaid' ? null : form.basis,
    delayBudget: [],
    units: { input: form.inputUnit.trim(), output: form.outputUnit.trim() },
  };
  return { content, errors };
}
