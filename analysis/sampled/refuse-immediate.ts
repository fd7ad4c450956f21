import { LoopError } from '@/analysis/loop/loop-error';
import type { SampledModel } from './sampled-model';
import { partsInW } from './sampled-stability';

const SINGULAR = 1e-12;

/** @throws LoopError where L = −1 at z = ∞: a sample sees the very command that it asks for, and the two never agree. */
export const refuseImmediate = (model: SampledModel): void => {
  const parts = partsInW(model);
  const excess = parts.reduce((sum, { zeros, poles }) => sum + poles.length - zeros.length, 0);
  const immediate = excess > 0 ? 0 : parts.reduce((gain, part) => gain * part.gain, 1);
  if (Math.abs(1 + immediate) > SINGULAR) return;
  throw new LoopError({
    pointer: '/controller',
    detail: 'Plant and controller answer at once and their gains multiply to −1: the loop has no solution.',
    code: 'singularLoop',
  });
};
