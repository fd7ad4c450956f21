import type { Loop } from '@/contract';

type Filter = Loop['controller']['filters'][number];

/** answer[k] = Σ forward[i]·input[k − i] − Σ back[i]·answer[k − 1 − i]. */
export interface DigitalFilter {
  readonly forward: readonly number[];
  readonly back: readonly number[];
}

/** A quotient of polynomials in s, ascending: the same number of coefficients above and below. */
interface Analogue {
  readonly above: readonly number[];
  readonly below: readonly number[];
  /** s stands for this times (z − 1)/(z + 1). */
  readonly scale: number;
}

/**
 * A filter by the trapezoidal rule, a notch pre-warped at its centre; null where it does nothing (a time constant of 0).
 *
 * @example digitalFilter({ kind: 'lowPass', timeConstant: 0.05 }, 0.1) // { forward: [0.5, 0.5], back: [0] }
 */
export const digitalFilter = (filter: Filter, period: number): DigitalFilter | null => {
  const analogue = analogueOf(filter, period);
  if (!analogue) return null;
  const above = inDelays(analogue.above, analogue.scale);
  const below = inDelays(analogue.below, analogue.scale);
  return { forward: above.map((b) => b / below[0]), back: below.slice(1).map((a) => a / below[0]) };
};

const analogueOf = (filter: Filter, period: number): Analogue | null => {
  const scale = 2 / period;
  if (filter.kind === 'lowPass') return filter.timeConstant === 0 ? null : { above: [1, 0], below: [1, filter.timeConstant], scale };
  if (filter.kind === 'leadLag') return { above: [1, filter.zeroTime], below: [1, filter.poleTime], scale };
  const { frequency, depth, width } = filter;
  const damping = 2 * width * frequency;
  const square = frequency * frequency;
  const warped = frequency / Math.tan((frequency * period) / 2);
  return { above: [square, depth * damping, 1], below: [square, damping, 1], scale: warped };
};

/** Σ cₖ·(scale·(1 − q)/(1 + q))ᵏ·(1 + q)ⁿ in ascending powers of q = 1/z, of degree n = 1 or 2. */
const inDelays = ([c0, c1, c2]: readonly number[], scale: number): number[] => {
  const first = c1 * scale;
  if (c2 === undefined) return [c0 + first, c0 - first];
  const second = c2 * scale * scale;
  return [c0 + first + second, 2 * (c0 - second), c0 - first + second];
};
