import type { Loop } from '@/contract';
import { quadraticRoots } from '@/analysis/numbers/polynomial-roots';
import type { Rational } from './model';
import { product, rootOfTime, timeFactor, UNITY } from './rational';

type Filter = Loop['controller']['filters'][number];

/** All filters at the controller's output in series, factored. @see REFERENCES numerics "The loop" */
export const buildFilters = (filters: readonly Filter[]): Rational => product(filters.map(buildFilter));

const buildFilter = (filter: Filter): Rational => {
  if (filter.kind === 'lowPass') return lag(filter.timeConstant);
  if (filter.kind === 'leadLag')
    return {
      gain: timeFactor(filter.zeroTime) / timeFactor(filter.poleTime),
      zeros: rootOfTime(filter.zeroTime),
      poles: rootOfTime(filter.poleTime),
    };
  const { frequency, depth, width } = filter;
  const square = frequency * frequency;
  return {
    gain: 1,
    zeros: quadraticRoots(1, 2 * width * depth * frequency, square),
    poles: quadraticRoots(1, 2 * width * frequency, square),
  };
};

/** 1/(1 + s·time). */
export const lag = (time: number): Rational => (time === 0 ? UNITY : { gain: 1 / time, zeros: [], poles: rootOfTime(time) });
