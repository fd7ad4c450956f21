import type { Analysis } from '@/contract';
import type { LoopFunction } from './loop-function';
import { IM, PHASE, RE, ROW } from './sample';

/** L at the frequencies asked for, rad/s. */
export const exactValues = (loop: LoopFunction, frequencies: readonly number[]): Analysis['at'] => {
  const row = new Float64Array(ROW);
  return frequencies.map((frequency) => {
    loop.sampleAt(frequency, row, 0);
    return { frequency, re: row[RE], im: row[IM], phaseDegrees: (row[PHASE] * 180) / Math.PI };
  });
};
