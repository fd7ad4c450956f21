import type { Analysis, FrequencyResponse } from '@/contract';
import { toDecibels } from './units';

/** A margin as Bode shows it: a bar from the reference line to the curve at a crossover. Decibels or degrees. */
export interface MarginBar {
  readonly frequency: number;
  readonly from: number;
  readonly to: number;
}

/** The gain margin, or where there is none the reduction margin: from 0 dB to |L| at its phase crossover. Null where neither is finite. */
export function gainMarginBar({ margins }: Pick<Analysis, 'margins'>): (MarginBar & { factor: number }) | null {
  const margin = margins.gain ?? margins.gainReduction;
  if (margin === null || margin.frequency === null || margin.frequency <= 0) return null;
  return { frequency: margin.frequency, from: 0, to: -toDecibels(margin.factor), factor: margin.factor };
}

/** The phase margin: from the odd half turn that it is counted from to arg L (degrees, unwrapped) at its gain crossover. */
export function phaseMarginBar(
  { margins }: Pick<Analysis, 'margins'>,
  phaseAt: (frequency: number) => number,
): (MarginBar & { degrees: number }) | null {
  if (margins.phase === null) return null;
  const { frequency, degrees } = margins.phase;
  const phase = phaseAt(frequency);
  return { frequency, from: phase - degrees, to: phase, degrees };
}

/** The gain crossover at which the phase margin is read; null where |L| never crosses 1. */
export const crossoverOf = ({ margins }: Pick<Analysis, 'margins'>): number | null => margins.phase?.frequency ?? null;

/** The indices of a response that lie in a window, one more on either side so that the curve reaches the picture's ends. */
export function indicesWithin({ frequencies }: FrequencyResponse, [low, high]: readonly [number, number]): [number, number] {
  const first = frequencies.findIndex((f) => f >= low);
  const end = frequencies.findLastIndex((f) => f <= high);
  return [Math.max(0, first - 1), Math.min(frequencies.length - 1, end + 1)];
}
