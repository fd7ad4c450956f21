import type { Filter } from '@/contract';

export const filterKinds: readonly Filter['kind'][] = ['lowPass', 'notch', 'leadLag'];

/** As many as a design may hold. */
export const MOST_FILTERS = 8;

/** Where a filter stands by itself, in crossovers: far enough above to cost little, near enough to be seen. */
const PLACE = 5;
const DEFAULT_CROSSOVER = 10;

const twoFigures = (value: number): number => Number(value.toPrecision(2));

/** A filter to begin with, placed by the loop's crossover in rad/s where it has one. */
export function newFilter(kind: Filter['kind'], crossover: number | null): Filter {
  const frequency = twoFigures(PLACE * (crossover ?? DEFAULT_CROSSOVER));
  const time = twoFigures(1 / frequency);
  if (kind === 'lowPass') return { kind, timeConstant: time };
  if (kind === 'notch') return { kind, frequency, depth: 0.1, width: 0.5 };
  return { kind, zeroTime: twoFigures(2 * time), poleTime: time };
}

export const withFilter = (filters: readonly Filter[], at: number, filter: Filter): readonly Filter[] => filters.with(at, filter);

export const withoutFilter = (filters: readonly Filter[], at: number): readonly Filter[] => filters.toSpliced(at, 1);

/** The filter at `at` one place earlier. */
export const earlier = (filters: readonly Filter[], at: number): readonly Filter[] =>
  filters.toSpliced(at - 1, 2, filters[at], filters[at - 1]);
