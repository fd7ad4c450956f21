import { LoopError } from '@/analysis/loop/loop-error';

/** A formula refused: why, and at which character (counted from 0). */
export const refusal = (reason: string, place: number): LoopError =>
  new LoopError({ pointer: '/plant/text', detail: `Character ${place + 1}: ${reason}`, code: 'formula' });
