import { describePlant, LoopError } from '@/analysis';
import { parseNumber } from '@/components/ui/parse-number';
import type { PlantContent, PlantRevision } from '@/contract';
import { parseCoefficients } from './notation/parse-coefficients';

export type Basis = 'measured' | 'assumed' | 'unsaid';

/** The plant editor's fields, as they were typed. */
export interface PlantForm {
  name: string;
  numerator: string;
  denominator: string;
  deadTime: string;
  basis: Basis;
  sensorLag: string;
  sensorDeadTime: string;
  inputUnit: string;
  outputUnit: string;
  note: string;
}

export type PlantFormErrors = Partial<Record<keyof PlantForm, string>>;

export const emptyPlantForm: PlantForm = {
  name: '',
  numerator: '',
  denominator: '',
  deadTime: '0',
  basis: 'unsaid',
  sensorLag: '0',
  sensorDeadTime: '0',
  inputUnit: '',
  outputUnit: '',
  note: '',
};

const list = (numbers: readonly number[]) => numbers.join(', ');

/** A kept revision as the editor shows it. What was not entered as coefficients is shown as the coefficients that it comes to. */
export function plantForm({ name, plant, deadTimeBasis, sensor, units }: PlantRevision): PlantForm {
  const { numerator, denominator, deadTime } = plant.kind === 'coefficients' ? plant : describePlant(plant);
  return {
    name,
    numerator: list(numerator),
    denominator: list(denominator),
    deadTime: String(deadTime),
    basis: deadTimeBasis ?? 'unsaid',
    sensorLag: String(sensor?.timeConstant ?? 0),
    sensorDeadTime: String(sensor?.deadTime ?? 0),
    inputUnit: units.input,
    outputUnit: units.output,
    note: '',
  };
}

const MOST_COEFFICIENTS = 25;
const LONGEST_S = 1e4;

function readPolynomial(text: string, name: string): { numbers: number[] } | { problem: string } {
  if (text.trim() === '') return { problem: `${name} has at least one coefficient.` };
  const read = parseCoefficients(text);
  if ('wrong' in read) return { problem: read.wrong === '' ? 'A coefficient is missing.' : `“${read.wrong}” is not a number.` };
  if (read.numbers.length > MOST_COEFFICIENTS) return { problem: `${name} has at most ${MOST_COEFFICIENTS} coefficients.` };
  return read.numbers.every((c) => c === 0) ? { problem: `${name} is not zero.` } : read;
}

function readTime(text: string, name: string): { seconds: number } | { problem: string } {
  const seconds = parseNumber(text);
  if (seconds === null) return { problem: `${name} is a number, as in 0.08.` };
  if (seconds < 0) return { problem: `${name} is 0 or more.` };
  return seconds > LONGEST_S ? { problem: `${name} is at most 10,000 s.` } : { seconds };
}

const engineFields: Readonly<Record<string, keyof PlantForm>> = {
  '/plant/numerator': 'numerator',
  '/plant/denominator': 'denominator',
  '/plant/deadTime': 'deadTime',
  '/plant': 'denominator',
  '/name': 'name',
};

/** The field that a JSON Pointer of the server or the engine means. */
export const fieldOf = (pointer: string): keyof PlantForm | undefined =>
  engineFields[pointer] ?? engineFields[pointer.replace(/\/\d+$/, '')];

/** What the engine has against a plant that is well written but means nothing. */
function meaninglessField(plant: PlantContent['plant']): PlantFormErrors {
  try {
    describePlant(plant);
    return {};
  } catch (error) {
    if (error instanceof LoopError) return { [fieldOf(error.pointer) ?? 'denominator']: error.detail };
    throw error;
  }
}

export interface ReadPlantForm {
  /** The plant, where every field that makes it can be read. */
  content: PlantContent | null;
  errors: PlantFormErrors;
}

/** Reads the editor's fields: the plant they describe, and at each field that does not what is wrong with it. */
export function readPlantForm(form: PlantForm): ReadPlantForm {
  const errors: PlantFormErrors = form.name.trim() === '' ? { name: 'A name has at least one character.' } : {};
  const take = <Value extends object>(field: keyof PlantForm, read: Value | { problem: string }): Value | null => {
    if (!('problem' in read)) return read;
    errors[field] = read.problem;
    return null;
  };
  const numerator = take('numerator', readPolynomial(form.numerator, 'The numerator'));
  const denominator = take('denominator', readPolynomial(form.denominator, 'The denominator'));
  const deadTime = take('deadTime', readTime(form.deadTime, 'Dead time'));
  const lag = take('sensorLag', readTime(form.sensorLag, 'The sensor’s lag'));
  const sensorDeadTime = take('sensorDeadTime', readTime(form.sensorDeadTime, 'The sensor’s dead time'));
  if (!numerator || !denominator || !deadTime || !lag || !sensorDeadTime) return { content: null, errors };
  const plant: PlantContent['plant'] = {
    kind: 'coefficients',
    numerator: numerator.numbers,
    denominator: denominator.numbers,
    deadTime: deadTime.seconds,
  };
  const meaning = meaninglessField(plant);
  if (Object.keys(meaning).length > 0) return { content: null, errors: { ...errors, ...meaning } };
  const sensed = lag.seconds > 0 || sensorDeadTime.seconds > 0;
  const content: PlantContent = {
    plant,
    sensor: sensed ? { timeConstant: lag.seconds, deadTime: sensorDeadTime.seconds } : null,
    deadTimeBasis: form.basis === 'unsaid' ? null : form.basis,
    delayBudget: [],
    units: { input: form.inputUnit.trim(), output: form.outputUnit.trim() },
  };
  return { content, errors };
}
