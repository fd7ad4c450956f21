import type { Loop } from '@/contract';
import type { Complex } from '@/analysis/numbers/complex';
import { expandRoots } from '@/analysis/numbers/polynomial';
import type { Rational } from './model';
import { buildPlant } from './plant';
import { plantInWords } from './plant-in-words';

/** A plant read back: factored, expanded, and as a sentence. */
export interface PlantDescription {
  /** Ratio of the leading coefficients: the k of k·Π(s − zero)/Π(s − pole). */
  gain: number;
  zeros: Complex[];
  poles: Complex[];
  deadTime: number;
  /** Descending powers of s. */
  numerator: number[];
  denominator: number[];
  /** Roots are what was given and the coefficients are multiplied out of them; otherwise the other way round. */
  factored: boolean;
  words: string;
}

/**
 * Reads a plant back to the person who entered it.
 * @throws LoopError where the plant has no meaning
 */
export const describePlant = (plant: Loop['plant']): PlantDescription => {
  const { rational, deadTime } = buildPlant(plant);
  return describeRational(rational, deadTime);
};

export const describeRational = (rational: Rational, deadTime: number): PlantDescription => {
  const { gain, zeros, poles, coefficients } = rational;
  return {
    gain,
    zeros: [...zeros],
    poles: [...poles],
    deadTime,
    numerator: coefficients ? [...coefficients.numerator] : expandRoots(zeros).map((c) => c * gain),
    denominator: coefficients ? [...coefficients.denominator] : expandRoots(poles),
    factored: coefficients === undefined,
    words: plantInWords(rational, deadTime),
  };
};
