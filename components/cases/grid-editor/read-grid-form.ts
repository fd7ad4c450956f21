import { gridIssues, parameterNames } from '@/analysis/project';
import { parseNumber } from '@/components/ui/parse-number';
import { type Axis, CreateGrid, type GridList, type PlantRevision } from '@/contract';
import { axisFrom, axisName, axisText, caseAxes } from '@/figures/axis-text';
import { type AxisForm, type GridForm, pointsOf } from './grid-form';
import { tooLarge } from './grid-size';
import { isOwn, splitList } from './split-list';

/** By place: "speed.at", "speed.deadTime", in rows "speed.2.at"; "lists" and "plantRevision" for the whole. */
export type GridErrors = Readonly<Record<string, string>>;

export interface ReadGridForm {
  readonly lists: readonly GridList[] | null;
  /** Points of each list that is used. */
  readonly counts: readonly number[];
  readonly errors: GridErrors;
}

type Say = (place: string, message: string) => void;

const placeAt = (axis: Axis, { way }: AxisForm, point: number, column: string) =>
  way === 'rows' ? `${axis}.${point}.${column}` : `${axis}.${column}`;

/** In lists a wrong value is named, since many stand in one field. */
const naming = ({ way }: AxisForm, text: string, message: string) => (way === 'rows' ? message : `“${text}”: ${message}`);

function countMismatch(axis: Axis, form: AxisForm, say: Say): void {
  if (form.way === 'rows') return;
  const places = splitList(form.at).length;
  for (const [name, text] of Object.entries(form.parameters)) {
    const values = splitList(text).length;
    if (values > 1 && values !== places)
      say(`${axis}.${name}`, `${values} values for ${places} ${places === 1 ? 'point' : 'points'}: one for each, or one for all.`);
  }
}

function readAxis(
  axis: Axis,
  form: AxisForm,
  { speedUnit, names, say }: { speedUnit: GridForm['speedUnit']; names: readonly string[]; say: Say },
) {
  const points = pointsOf(form).map((point, index) => {
    const number = (column: string, text: string): number | undefined => {
      const value = parseNumber(text);
      if (value === null) say(placeAt(axis, form, index, column), naming(form, text.trim(), 'A number, as in 0.35.'));
      return value ?? undefined;
    };
    const at = axisFrom(axis, number('at', point.at) ?? 0, speedUnit);
    const parameters = Object.fromEntries(
      names.flatMap((name) => {
        const text = point.parameters[name] ?? '';
        const value = isOwn(text) ? undefined : number(name, text);
        return value === undefined ? [] : [[name, value]];
      }),
    );
    const name = point.name.trim() || (axis === 'speed' ? axisText(axis, at, speedUnit) : undefined);
    return { at, parameters, basis: point.basis, ...(name && { name }) };
  });
  return { axis, points } as GridList;
}

/** Reads the lists of a grid: the cases that they make, and at each place that says nothing what is wrong with it. */
export function readGridForm(form: GridForm, plant: PlantRevision | undefined, there: number): ReadGridForm {
  const errors: Record<string, string> = {};
  const say: Say = (place, message) => void (errors[place] ??= message);
  const used = caseAxes.filter((axis) => pointsOf(form.axes[axis]).length > 0);
  const counts = used.map((axis) => pointsOf(form.axes[axis]).length);
  for (const axis of used) countMismatch(axis, form.axes[axis], say);
  const longest = used[counts.indexOf(Math.max(...counts))];
  const large = tooLarge(counts, form.replace ? 0 : there);
  if (large !== null) {
    say(placeAt(longest, form.axes[longest], 0, 'at'), large);
    return { lists: null, counts, errors };
  }
  const names = plant ? parameterNames(plant.plant) : [];
  const lists = used.map((axis) => readAxis(axis, form.axes[axis], { speedUnit: form.speedUnit, names, say }));
  const plantRevision = form.plantRevision === '' ? null : parseNumber(form.plantRevision);
  if (form.plantRevision !== '' && plantRevision === null) say('plantRevision', 'Revisions are counted from 1.');
  const read = CreateGrid.safeParse({ plantId: form.plantId, plantRevision, lists, replace: form.replace });
  const issues = [
    ...(read.error?.issues ?? []),
    ...gridIssues(lists, names).map(({ path, message }) => ({ path: ['lists', ...path], message })),
  ];
  for (const { path, message } of issues) {
    const [, list, , point, first, second] = path.map(String);
    const axis = used[Number(list)];
    if (axis === undefined)
      say(
        String(path[0]),
        path.length === 1 && used.length === 0 ? `Type ${axisName('speed').toLowerCase()}s, masses or grades.` : message,
      );
    else say(placeAt(axis, form.axes[axis], Number(point), second ?? first ?? 'at'), message);
  }
  return { lists: Object.keys(errors).length === 0 ? lists : null, counts, errors };
}
