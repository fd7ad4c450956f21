import type { Axis, CaseBasis } from '@/contract';
import { caseAxes } from '@/figures/axis-text';
import type { SpeedUnit } from '@/figures/units';
import { splitList } from './split-list';

/** One point of a list: where it stands, and what the plant is there, as typed. */
export interface PointForm {
  readonly at: string;
  readonly name: string;
  readonly basis: CaseBasis;
  readonly parameters: Readonly<Record<string, string>>;
}

/** The points along one axis, typed as lists or row by row. */
export interface AxisForm {
  readonly way: 'lists' | 'rows';
  readonly at: string;
  readonly parameters: Readonly<Record<string, string>>;
  /** Of every point of the lists. */
  readonly basis: CaseBasis;
  readonly rows: readonly PointForm[];
}

export interface GridForm {
  readonly plantId: string;
  /** "" is the latest revision. */
  readonly plantRevision: string;
  readonly axes: Readonly<Record<Axis, AxisForm>>;
  /** In place of all cases that there are. */
  readonly replace: boolean;
  readonly speedUnit: SpeedUnit;
}

const emptyAxis: AxisForm = { way: 'lists', at: '', parameters: {}, basis: 'extrapolated', rows: [] };
export const emptyPoint: PointForm = { at: '', name: '', basis: 'extrapolated', parameters: {} };

export const emptyGridForm = (plantId: string, speedUnit: SpeedUnit): GridForm => ({
  plantId,
  plantRevision: '',
  axes: { speed: emptyAxis, mass: emptyAxis, grade: emptyAxis },
  replace: false,
  speedUnit,
});

/** Lists as rows: the n-th of each beside each other; one value alone stands for every point. */
function toRows({ at, parameters, basis }: AxisForm): PointForm[] {
  const places = splitList(at);
  const columns = Object.entries(parameters).map(([name, text]) => [name, splitList(text)] as const);
  const count = Math.max(places.length, ...columns.map(([, values]) => (values.length === 1 ? 1 : values.length)));
  return Array.from({ length: count }, (_, i) => ({
    at: places[i] ?? '',
    name: '',
    basis,
    parameters: Object.fromEntries(columns.map(([name, values]) => [name, (values.length === 1 ? values[0] : values[i]) ?? ''])),
  }));
}

/** Rows as lists; a dash keeps the place of a value that is not there. */
function toLists({ rows }: AxisForm): Pick<AxisForm, 'at' | 'parameters' | 'basis'> {
  const names = [...new Set(rows.flatMap(({ parameters }) => Object.keys(parameters)))];
  const list = (texts: readonly string[]) =>
    texts.every((text) => text.trim() === '') ? '' : texts.map((text) => text.trim() || '–').join('; ');
  return {
    at: list(rows.map(({ at }) => at)),
    parameters: Object.fromEntries(names.map((name) => [name, list(rows.map(({ parameters }) => parameters[name] ?? ''))])),
    basis: rows[0]?.basis ?? 'extrapolated',
  };
}

/** The same points, typed the other way. */
export function switchWay(axis: AxisForm, way: AxisForm['way']): AxisForm {
  if (way === axis.way) return axis;
  return way === 'rows' ? { ...axis, way, rows: toRows(axis) } : { ...axis, way, ...toLists(axis) };
}

/** The points of an axis, whichever way they were typed; places that are left empty at the end are none. */
export const pointsOf = (axis: AxisForm): readonly PointForm[] => (axis.way === 'rows' ? axis.rows : toRows(axis));

const isAxisForm = (value: unknown): value is AxisForm => {
  if (typeof value !== 'object' || value === null) return false;
  const axis = value as Record<string, unknown>;
  return typeof axis.at === 'string' && Array.isArray(axis.rows) && typeof axis.parameters === 'object' && typeof axis.way === 'string';
};

/** Whether something that was kept on this device is a form, and not what an older version kept. */
export function isGridForm(value: unknown): value is GridForm {
  if (typeof value !== 'object' || value === null) return false;
  const form = value as Record<string, unknown>;
  const axes = form.axes as Record<string, unknown> | null | undefined;
  return typeof form.plantId === 'string' && typeof axes === 'object' && axes !== null && caseAxes.every((axis) => isAxisForm(axes[axis]));
}
