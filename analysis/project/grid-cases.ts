import type { Axis, CaseBasis, CaseContent, CaseParameters, GridList } from '@/contract';

/** One combination of a grid's points, before it has a plant. */
export type GridCase = Pick<CaseContent, 'name' | 'parameters' | 'axes' | 'basis'>;

type Placed = GridList['points'][number] & { readonly axis: Axis };

const fromSurest: readonly CaseBasis[] = ['measured', 'figures', 'extrapolated'];

const number = (value: number) => value.toLocaleString('en', { maximumFractionDigits: 1 });

const words: Record<Axis, (at: number) => string> = {
  speed: (at) => `${number(at * 3.6)} km/h`,
  mass: (at) => `${number(at)} kg`,
  grade: (at) => `${number(at)} % grade`,
};

const nameOf = (points: readonly Placed[]) => points.map(({ axis, at, name }) => name ?? words[axis](at)).join(', ');

function parametersOf(points: readonly Placed[]): CaseParameters {
  const together: CaseParameters = Object.assign({}, ...points.map(({ parameters }) => parameters));
  const factors = points.flatMap(({ parameters }) => parameters.gainFactor ?? []);
  return factors.length === 0 ? together : { ...together, gainFactor: factors.reduce((product, factor) => product * factor, 1) };
}

/** A combination is known no better than its least known point. */
const basisOf = (points: readonly Placed[]) =>
  fromSurest[Math.max(...points.map(({ basis = 'extrapolated' }) => fromSurest.indexOf(basis)))];

function combinations(lists: readonly GridList[]): Placed[][] {
  return lists.reduce<Placed[][]>(
    (made, { axis, points }) => made.flatMap((before) => points.map((point) => [...before, { ...point, axis }])),
    [[]],
  );
}

/**
 * Every combination of the lists' points, the last list running fastest. Gain factors multiply; any other parameter
 * is the one list's that names it.
 * @example gridCases([{ axis: 'speed', points: [{ at: 25 / 3, … }] }, { axis: 'mass', points: [{ at: 1380, … }] }])[0].name // '30 km/h, 1,380 kg'
 */
export const gridCases = (lists: readonly GridList[]): GridCase[] =>
  combinations(lists).map((points) => ({
    name: nameOf(points),
    parameters: parametersOf(points),
    axes: Object.fromEntries(points.map(({ axis, at }) => [axis, at])),
    basis: basisOf(points),
  }));

export interface GridIssue {
  /** Into the lists. */
  readonly path: readonly (string | number)[];
  readonly message: string;
}

/** Parameters that the plant has not, and those that two lists would set at once. @param names what a case on the plant may set */
export function gridIssues(lists: readonly GridList[], names: readonly string[]): GridIssue[] {
  return lists.flatMap(({ points }, list) =>
    points.flatMap(({ parameters }, point) =>
      Object.keys(parameters).flatMap((name): GridIssue[] => {
        const path = [list, 'points', point, 'parameters', name];
        if (!names.includes(name)) return [{ path, message: unknownParameter(name, names) }];
        const before = lists.slice(0, list).find((other) => other.points.some((one) => Object.hasOwn(one.parameters, name)));
        if (!before || name === 'gainFactor') return [];
        return [{ path, message: `The list along ${before.axis} sets “${name}” too; only gain factors multiply.` }];
      }),
    ),
  );
}

export const unknownParameter = (name: string, names: readonly string[]) =>
  `This plant has no “${name}”; a case may set ${names.join(', ')}.`;
