import type { PlantRevision } from '@/contract';
import { fieldsIn, type Notation, notations, type NotationText, textIn } from './notation/notation';
import { writePlant } from './notation/write-plant';

export type Basis = 'measured' | 'assumed' | 'unsaid';

/** The plant editor's fields, as they were typed. */
export interface PlantForm extends NotationText {
  name: string;
  /** The notation that is shown and counts; what stands in the others waits. */
  notation: Notation;
  /** What stood in each notation, and as dead time, when they last said the same plant. */
  agreed: Partial<Record<Notation | 'deadTime', string>>;
  /** What the editor wrote in a notation by itself. */
  written: Partial<Record<Notation, string>>;
  /** What was typed in a notation before another was written over it. */
  replaced: Partial<Record<Notation, Partial<NotationText>>>;
  basis: Basis;
  sensorLag: string;
  sensorDeadTime: string;
  inputUnit: string;
  outputUnit: string;
  note: string;
}

export const emptyPlantForm: PlantForm = {
  name: '',
  notation: 'coefficients',
  numerator: '',
  denominator: '',
  gain: '',
  zeros: '',
  poles: '',
  formula: '',
  parameters: {},
  agreed: {},
  written: {},
  replaced: {},
  deadTime: '0',
  basis: 'unsaid',
  sensorLag: '0',
  sensorDeadTime: '0',
  inputUnit: '',
  outputUnit: '',
  note: '',
};

function writtenAs(plant: PlantRevision['plant']): Partial<NotationText> {
  if (plant.kind !== 'formula') return writePlant(plant, plant.kind, String);
  const parameters = Object.fromEntries(Object.entries(plant.parameters).map(([name, value]) => [name, String(value)]));
  return { formula: plant.text, parameters };
}

/** A kept revision as the editor shows it: in the notation in which it was written. */
export function plantForm({ name, plant, deadTimeBasis, sensor, units }: PlantRevision): PlantForm {
  return {
    ...emptyPlantForm,
    ...writtenAs(plant),
    name,
    notation: plant.kind,
    basis: deadTimeBasis ?? 'unsaid',
    sensorLag: String(sensor?.timeConstant ?? 0),
    sensorDeadTime: String(sensor?.deadTime ?? 0),
    inputUnit: units.input,
    outputUnit: units.output,
  };
}

const shared = ['name', 'notation', 'basis', 'sensorLag', 'sensorDeadTime', 'inputUnit', 'outputUnit', 'note'] as const;

/** Whether what is shown differs from what was kept. What waits in the other notations does not count. */
export const isChanged = (form: PlantForm, kept: PlantForm): boolean =>
  shared.some((field) => form[field] !== kept[field]) ||
  JSON.stringify(fieldsIn(form, form.notation)) !== JSON.stringify(fieldsIn(kept, form.notation));

/** Whether anything was typed that is not kept, shown or not. */
export const hasTyped = (form: PlantForm, kept: PlantForm): boolean =>
  isChanged(form, kept) ||
  notations.some(({ value }) => {
    const text = textIn(form, value);
    return text !== textIn(kept, value) && text !== form.written[value];
  });
