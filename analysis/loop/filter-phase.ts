import type { Loop } from '@/contract';

type Filter = Loop['controller']['filters'][number];

/**
 * arg of a filter at ω, degrees, unwrapped from 0 at ω = 0: negative is lag. A notch of depth 0 jumps by +180° at its centre.
 *
 * @see REFERENCES numerics "Frequency response"
 * @example filterPhaseDegrees({ kind: 'lowPass', timeConstant: 0.1 }, 10) // −45
 */
export const filterPhaseDegrees = (filter: Filter, frequency: number): number => (argument(filter, frequency) * 180) / Math.PI;

function argument(filter: Filter, frequency: number): number {
  if (filter.kind === 'lowPass') return -Math.atan(frequency * filter.timeConstant);
  if (filter.kind === 'leadLag') return Math.atan(frequency * filter.zeroTime) - Math.atan(frequency * filter.poleTime);
  const { frequency: centre, depth, width } = filter;
  const real = centre * centre - frequency * frequency;
  const imaginary = 2 * width * centre * frequency;
  return Math.atan2(depth * imaginary, real) - Math.atan2(imaginary, real);
}
