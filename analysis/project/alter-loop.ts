import type { Loop } from '@/contract';
import { overridePlant } from './override-plant';

const deadTimeOf = ({ plant }: Loop) => (plant.kind === 'formula' ? 0 : plant.deadTime);

/** The loop with its plant's gain times `factor`: what a car with more or less torque for the same command does. */
export const withLoopGain = (loop: Loop, factor: number): Loop => ({
  ...loop,
  plant: overridePlant({ plant: loop.plant }, { gainFactor: factor }),
});

/** The loop with `seconds` more dead time. */
export const withMoreDeadTime = (loop: Loop, seconds: number): Loop => ({
  ...loop,
  plant: overridePlant({ plant: loop.plant }, { deadTime: deadTimeOf(loop) + seconds }),
});
