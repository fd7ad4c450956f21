import { LoopError } from '@/analysis/loop/loop-error';
import { limitOf } from './end-values';
import type { LoopFunction } from './loop-function';

const SINGULAR = 1e-12;

/** @throws LoopError where 1 + L(∞) = 0: direct feedthrough feeds itself and no signal has a value. */
export const refuseSingular = (loop: LoopFunction): void => {
  const limit = limitOf(loop.atInfinity.loop, 'infinity');
  if (loop.deadTime > 0 || Math.abs(1 + limit) > SINGULAR) return;
  throw new LoopError({
    pointer: '/controller',
    detail: 'Plant and controller answer at once and their gains multiply to −1: the loop has no solution.',
    code: 'singularLoop',
  });
};
