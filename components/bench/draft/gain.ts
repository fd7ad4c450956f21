import type { Form, Settings } from './settings';

/** The gains that have a rule of their own, in the order they stand in. */
export const gains = ['kp', 'integral', 'derivative', 'filterTime'] as const;
export type Gain = (typeof gains)[number];

interface GainWords {
  readonly label: 'Kp' | 'Ki' | 'Kd' | 'Ti' | 'Td' | 'Tf';
  readonly name: string;
}

const timed: Readonly<Record<Gain, GainWords>> = {
  kp: { label: 'Kp', name: 'Proportional gain' },
  integral: { label: 'Ti', name: 'Integral time' },
  derivative: { label: 'Td', name: 'Derivative time' },
  filterTime: { label: 'Tf', name: 'Derivative filter time' },
};

const words: Readonly<Record<Form, Readonly<Record<Gain, GainWords>>>> = {
  parallel: { ...timed, integral: { label: 'Ki', name: 'Integral gain' }, derivative: { label: 'Kd', name: 'Derivative gain' } },
  ideal: timed,
  // In series form Tf filters the whole controller.
  series: { ...timed, filterTime: { label: 'Tf', name: 'Filter time' } },
};

export const gainWords = (gain: Gain, form: Form): GainWords => words[form][gain];

/** Whether the number is a time in s, which has no sign. Every gain has one (a brake loop's are negative). */
export const isTime = (gain: Gain, form: Form): boolean => gain === 'filterTime' || (form !== 'parallel' && gain !== 'kp');

/** An integral time of 0 would be infinite integral action. */
export const mustBePositive = (gain: Gain, form: Form): boolean => gain === 'integral' && form !== 'parallel';

const SHORTEST_INTEGRAL_TIME = 1e-9;

/** The nearest value that the gain can have. */
export function clampGain(gain: Gain, form: Form, value: number): number {
  if (mustBePositive(gain, form)) return Math.max(SHORTEST_INTEGRAL_TIME, value);
  return isTime(gain, form) ? Math.max(0, value) : value;
}

/** Step of a nudge where the gain is too near zero for a percentage of it to be seen. */
const SMALLEST_STEP = 0.001;
const NEAR_ZERO = 1e-9;

interface Nudge {
  readonly gain: Gain;
  readonly settings: Settings;
  /** The value that was kept; null where the kept controller has none in this form. */
  readonly kept: number | null;
  /** 0.01 is one per cent up. */
  readonly fraction: number;
}

/**
 * A gain moved by a fraction of its magnitude; where it is near 0, of the kept value's, and of one where that is 0 too. Rounded to
 * six significant figures so that up and down again does not leave a tail of digits. null where there is nothing to move.
 */
export function nudged({ gain, settings, kept, fraction }: Nudge): number | null {
  const value = settings[gain];
  if (value === null) return null;
  const keptSize = Math.abs(kept ?? 0);
  const near = Math.abs(value) < Math.max(NEAR_ZERO, 0.01 * keptSize);
  const size = near ? keptSize || 1 : Math.abs(value);
  const step = fraction * size;
  const moved = value + (Math.abs(step) < SMALLEST_STEP * Math.abs(fraction) ? Math.sign(fraction) * SMALLEST_STEP : step);
  const exact = mustBePositive(gain, settings.form) ? value * (1 + fraction) : moved;
  return clampGain(gain, settings.form, roundedGain(exact));
}

/** Six significant figures: finer than any control unit takes, coarse enough to read back. */
export const roundedGain = (value: number): number => Number(value.toPrecision(6));
