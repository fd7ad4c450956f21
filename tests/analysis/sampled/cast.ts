import type { LoopInput } from '@/contract';

/** A sample period with backward rules and no computation delay, unless told otherwise. */
export const every = (
  period: number,
  { integral = 'backward', derivative = 'backward', computationDelay = 0 }: Partial<NonNullable<LoopInput['sampling']>> = {},
): Pick<LoopInput, 'sampling'> => ({ sampling: { period, integral, derivative, computationDelay } });
