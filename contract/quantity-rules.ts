import type { Quantity } from './common';

export type Bound = 'min' | 'max';

/** What a demand on one quantity may say. */
export interface QuantityRule {
  /** The bounds that make sense: a margin is demanded as a least value, a peak as a greatest. */
  readonly bounds: readonly Bound[];
  /** A limit or target lies above this … */
  readonly above: number;
  /** … and below this; either end itself is allowed where `inclusive` says so. */
  readonly below: number;
  readonly inclusive?: boolean;
  /** The range in words, as a refusal says it. */
  readonly range: string;
}

const LARGEST = 1e9;

const positive = (bounds: readonly Bound[], most = LARGEST): QuantityRule => ({
  bounds,
  above: 0,
  below: most,
  range: `more than 0 and less than ${most.toLocaleString('en')}`,
});
const between = (bound: Bound, [above, below]: readonly [number, number], range: string): QuantityRule => ({
  bounds: [bound],
  above,
  below,
  range,
});
const fromZero = (most: number): QuantityRule => ({
  bounds: ['max'],
  above: 0,
  below: most,
  inclusive: true,
  range: `from 0 to ${most.toLocaleString('en')}`,
});
const time = (bounds: readonly Bound[]) => positive(bounds, 1e4);

/** Senses and ranges of everything that can be demanded, in the contract's units. */
export const quantityRules: Readonly<Record<Quantity, QuantityRule>> = {
  gainMargin: between('min', [1, 1e6], 'a factor above 1 (0 dB)'),
  gainReduction: between('max', [0, 1], 'a factor between 0 and 1 (below 0 dB)'),
  phaseMargin: between('min', [0, 180], 'between 0° and 180°'),
  delayMargin: time(['min']),
  ms: between('max', [1, 1e3], 'above 1: |S| comes to 1 in every loop that lets go at high frequencies'),
  mt: positive(['max'], 1e3),
  modulusMargin: between('min', [0, 1], 'between 0 and 1'),
  diskMargin: between('min', [0, 2], 'between 0 and 2'),
  noiseGain: positive(['max']),
  bandwidth: positive(['min', 'max']),
  riseTime: time(['min', 'max']),
  settlingTime: time(['max']),
  overshootPercent: fromZero(1e3),
  undershootPercent: fromZero(1e3),
  steadyStateError: fromZero(LARGEST),
  loadPeak: positive(['max']),
  loadSettlingTime: time(['max']),
  controlPeak: positive(['max']),
};

/** Whether a limit or target is one that the quantity can take. */
export function isInRange(quantity: Quantity, value: number): boolean {
  const { above, below, inclusive = false } = quantityRules[quantity];
  return inclusive ? value >= above && value <= below : value > above && value < below;
}
