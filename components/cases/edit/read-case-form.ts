import { parameterNames } from '@/analysis/project';
import { parseNumber } from '@/components/ui/parse-number';
import { CreateCase, type CaseContent, type PlantRevision } from '@/contract';
import { axisFrom, caseAxes } from '@/figures/axis-text';
import type { CaseForm } from './case-form';

/** By field: "name", "plantRevision", "speed", "parameters.deadTime". */
export type CaseErrors = Readonly<Record<string, string>>;

export interface ReadCaseForm {
  readonly content: CaseContent | null;
  readonly errors: CaseErrors;
}

/** The field that a path into the body means. */
export function fieldAt(path: readonly PropertyKey[]): string {
  const [first, second] = path.map(String);
  if (first === 'parameters' && second !== undefined) return `parameters.${second}`;
  return first === 'axes' && second !== undefined ? second : (first ?? '');
}

export const fieldOfPointer = (pointer: string): string => fieldAt(pointer.split('/').slice(1));

/** The names that a case on this plant may set, in the order in which they are asked for. */
export const namesFor = (plant: PlantRevision | undefined): string[] => (plant ? parameterNames(plant.plant) : []);

/** Reads the fields of a case: what they say, and at each that says nothing what is wrong with it. */
export function readCaseForm(form: CaseForm, plant: PlantRevision | undefined): ReadCaseForm {
  const errors: Record<string, string> = {};
  const number = (field: string, text: string): number | undefined => {
    if (text.trim() === '') return undefined;
    const value = parseNumber(text);
    if (value === null) errors[field] = 'A number, as in 0.35.';
    return value ?? undefined;
  };
  const names = namesFor(plant);
  const parameters = Object.fromEntries(
    names.flatMap((name) => {
      const value = number(`parameters.${name}`, form.parameters[name] ?? '');
      return value === undefined ? [] : [[name, value]];
    }),
  );
  const axes = Object.fromEntries(
    caseAxes.flatMap((axis) => {
      const value = number(axis, form[axis]);
      return value === undefined ? [] : [[axis, axisFrom(axis, value, form.speedUnit)]];
    }),
  );
  if (form.plantRevision !== '' && form.plantRevision.trim() === '') errors.plantRevision = 'Revisions are counted from 1.';
  const plantRevision = number('plantRevision', form.plantRevision) ?? null;
  const read = CreateCase.safeParse({ name: form.name, plantId: form.plantId, plantRevision, parameters, axes, basis: form.basis });
  for (const { path, message } of read.error?.issues ?? []) errors[fieldAt(path)] ??= message;
  if (plant && plantRevision !== null && plantRevision > plant.revision)
    errors.plantRevision ??= `The newest revision is ${plant.revision}.`;
  return { content: read.success && Object.keys(errors).length === 0 ? read.data : null, errors };
}
