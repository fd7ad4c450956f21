import { LoopError } from '@/analysis/loop/loop-error';

/** What a loop is refused for while its axis is searched, continuous or sampled. */

export const tooMuch = () =>
  new LoopError({
    pointer: '/plant',
    detail: 'This loop has too many crossovers and peaks to analyse.',
    code: 'tooMuchToCompute',
  });

/** @param omega rad/s */
export const outOfRange = (omega: number) =>
  new LoopError({
    pointer: '/plant',
    detail: `The loop has no finite value at ${omega} rad/s: its numbers are too far apart.`,
    code: 'outOfRange',
  });
