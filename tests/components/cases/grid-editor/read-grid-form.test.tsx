import { describe, expect, it } from 'vitest';
import { type AxisForm, emptyGridForm, type GridForm, isGridForm, pointsOf, switchWay } from '@/components/cases/grid-editor/grid-form';
import { gridSize, sizeText, tooLarge } from '@/components/cases/grid-editor/grid-size';
import { readGridForm } from '@/components/cases/grid-editor/read-grid-form';
import { splitList } from '@/components/cases/grid-editor/split-list';
import type { Axis, PlantRevision } from '@/contract';
import { kmh, plantId } from '../cases-harness';

const plant = {
  id: plantId,
  revision: 3,
  plant: { kind: 'coefficients', numerator: [1], denominator: [1, 1], deadTime: 0 },
} as unknown as PlantRevision;
const formula = { ...plant, plant: { kind: 'formula', text: 'k/(m*s)', parameters: { k: 1, m: 1500 } } } as unknown as PlantRevision;

const empty = emptyGridForm(plantId, 'km/h');
function typed(axes: Partial<Record<Axis, Partial<AxisForm>>>, form: Partial<GridForm> = {}): GridForm {
  const filled = Object.fromEntries(Object.entries(empty.axes).map(([axis, blank]) => [axis, { ...blank, ...axes[axis as Axis] }]));
  return { ...empty, ...form, axes: filled as GridForm['axes'] };
}
const read = (form: GridForm, there = 0, on = plant) => readGridForm(form, on, there);
const count = (n: number) => Array.from({ length: n }, (_, i) => 1000 + i).join(' ');

describe('a list as people write it', () => {
  it.each([
    ['30, 40, 80', ['30', '40', '80']],
    ['30 40 80', ['30', '40', '80']],
    ['30,40,80', ['30', '40', '80']],
    ['0,17 0,14', ['0,17', '0,14']],
    ['0,17; 0,14;', ['0,17', '0,14']],
    ['  30 ', ['30']],
    ['', []],
  ])('"%s" is %j', (text, pieces) => {
    expect(splitList(text)).toEqual(pieces);
  });
});

describe('a grid from lists', () => {
  it('has a point for each place, in m/s, with the parameters that go with it', () => {
    const { lists, counts, errors } = read(
      typed({
        speed: { at: '30, 40', parameters: { deadTime: '0,17 –' }, basis: 'measured' },
        mass: { at: '1500', parameters: { gainFactor: '1.1' } },
      }),
    );
    expect(errors).toEqual({});
    expect(counts).toEqual([2, 1]);
    expect(lists).toEqual([
      {
        axis: 'speed',
        points: [
          { at: kmh(30), name: '30 km/h', parameters: { deadTime: 0.17 }, basis: 'measured' },
          { at: kmh(40), name: '40 km/h', parameters: {}, basis: 'measured' },
        ],
      },
      { axis: 'mass', points: [{ at: 1500, parameters: { gainFactor: 1.1 }, basis: 'extrapolated' }] },
    ]);
  });

  it('takes one value for all points, and a formula’s own parameters', () => {
    const { lists } = read(typed({ mass: { at: '1400 1500', parameters: { m: '1400 1500', k: '2' } } }), 0, formula);
    expect(lists?.[0].points.map(({ parameters }) => parameters)).toEqual([
      { m: 1400, k: 2 },
      { m: 1500, k: 2 },
    ]);
  });

  it.each([
    ['letters', { speed: { at: '30 fast' } }, 'speed.at', /fast.*number/],
    ['a place twice', { speed: { at: '30 30' } }, 'speed.at', /already/],
    ['a negative speed', { speed: { at: '-3' } }, 'speed.at', /0 or more/],
    [
      'fewer values than places',
      { speed: { at: '30 40 80', parameters: { deadTime: '0.1 0.2' } } },
      'speed.deadTime',
      /2 values for 3 points/,
    ],
    ['a negative dead time', { speed: { at: '30', parameters: { deadTime: '-1' } } }, 'speed.deadTime', /0 or more/],
    [
      'two lists that set one parameter',
      { speed: { at: '30', parameters: { deadTime: '0.1' } }, mass: { at: '1500', parameters: { deadTime: '0.2' } } },
      'mass.deadTime',
      /only gain factors multiply/,
    ],
  ])('says at its field what is wrong with %s', (_what, axes, place, message) => {
    const { lists, errors } = read(typed(axes));
    expect(lists).toBeNull();
    expect(errors[place]).toMatch(message);
  });

  it('says it at the row where it was typed row by row', () => {
    const rows = [
      { at: '30', name: '', basis: 'measured' as const, parameters: {} as Record<string, string> },
      { at: '40', name: '', basis: 'measured' as const, parameters: { deadTime: 'x' } as Record<string, string> },
    ];
    expect(read(typed({ speed: { way: 'rows', rows } })).errors).toEqual({ 'speed.1.deadTime': 'A number, as in 0.35.' });
  });

  it('of 10,000 cases is refused at the longest list, before anything is made of it', () => {
    const { errors, lists, counts } = read(
      typed({ speed: { at: Array.from({ length: 50 }, (_, i) => i).join(' ') }, mass: { at: count(200) } }),
    );
    expect(gridSize(counts)).toBe(10_000);
    expect(lists).toBeNull();
    expect(errors).toEqual({ 'mass.at': 'This grid has 10,000 cases; at most 400 are allowed.' });
  });

  it('counts those that there are unless it takes their place', () => {
    const form = typed({ mass: { at: count(300) } });
    expect(read(form, 200).errors['mass.at']).toBe('There are 200 cases already: 200 more fit, this grid adds 300.');
    expect(read({ ...form, replace: true }, 200).errors).toEqual({});
  });

  it('of nothing asks for a list', () => {
    expect(Object.keys(read(empty).errors)).toEqual(['lists']);
  });

  it('is counted while it is typed', () => {
    expect(sizeText([7, 4])).toBe('7 × 4 = 28 cases, at most 400');
    expect(sizeText([1])).toBe('1 case, at most 400');
    expect(tooLarge([20, 20], 0)).toBeNull();
    expect(tooLarge([20, 20], 1)).not.toBeNull();
  });
});

describe('points typed one way', () => {
  const lists: AxisForm = {
    way: 'lists',
    at: '30, 40, 80',
    parameters: { deadTime: '0.17 – 0.095', gainFactor: '1.1' },
    basis: 'measured',
    rows: [],
  };

  it('are the same points the other way, and back', () => {
    const rows = switchWay(lists, 'rows');
    expect(pointsOf(rows)).toEqual(pointsOf(lists));
    expect(rows.rows[1]).toEqual({ at: '40', name: '', basis: 'measured', parameters: { deadTime: '–', gainFactor: '1.1' } });
    expect(read(typed({ speed: switchWay(rows, 'lists') })).lists).toEqual(read(typed({ speed: lists })).lists);
  });

  it('come back from this device, and what an older version kept does not', () => {
    expect(isGridForm(JSON.parse(JSON.stringify(typed({ speed: lists }))))).toBe(true);
    expect(isGridForm({ plantId, axes: { speed: {} } })).toBe(false);
    expect(isGridForm(null)).toBe(false);
  });
});
