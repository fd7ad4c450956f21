import type { Loop } from '@/contract';
import { readFormula } from './read-formula';

/**
 * A plant with its formula worked out: by roots where it was written as a product, by coefficients where it was one
 * polynomial over another. Any other plant comes back as it is.
 * @throws LoopError at /plant/text
 */
export const resolvePlant = (plant: Loop['plant']): Exclude<Loop['plant'], { kind: 'formula' }> => {
  if (plant.kind !== 'formula') return plant;
  const { rational, deadTime } = readFormula(plant.text, plant.parameters);
  const { gain, zeros, poles, coefficients } = rational;
  if (!coefficients) return { kind: 'roots', gain, zeros: [...zeros], poles: [...poles], deadTime };
  return { kind: 'coefficients', numerator: [...coefficients.numerator], denominator: [...coefficients.denominator], deadTime };
};

/** A Loop whose plant needs no parser any more. @throws LoopError at /plant/text */
export const resolveFormula = (loop: Loop): Loop => ({ ...loop, plant: resolvePlant(loop.plant) });
