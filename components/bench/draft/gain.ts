import type { Settings } from './settings';

/** The gains that have a rule of their own, in the order they stand in. */
export const gains = ['kp', 'ki', 'kd', 'filterTime'] as const;
export type Gain = (typeof gains)[number];

interface GainWords {
  readonly label: string;
  readonly name: string;
}

export const gainWords: Readonly<Record<Gain, GainWords>> = {
  kp: { label: 'Kp', name: 'Proportional gain' },
  ki: { label: 'Ki', name: 'Integral gain' },
  kd: { label: 'Kd', name: 'Derivative gain' },
  filterTime: { label: 'Tf', name: 'Derivative filter time' },
};

/** Tf is a time and cannot be negative; every gain can (a brake loop has negative ones). */
export const mayBeNegative = (gain: Gain): boolean => gain !== 'filterTime';

export const clampGain = (gain: Gain, value: number): number => (mayBeNegative(gain) ? value : Math.max(0, value));

/**
 * The unit of a gain, from those of the plant: command per output, over or times seconds, with one fraction bar outside brackets.
 * Empty where the plant names none.
 * @example gainUnit('ki', { input: 'kN·m', output: 'm/s' }) // 'kN·m/((m/s)·s)'
 */
export function gainUnit(gain: Gain, { input, output }: { input: string; output: string }): string {
  if (gain === 'filterTime') return 's';
  if (!input || !output) return '';
  const per = /[/·]/.test(output) ? `(${output})` : output;
  const command = input.includes('/') ? `(${input})` : input;
  if (gain === 'kp') return `${command}/${per}`;
  return gain === 'ki' ? `${command}/(${per}·s)` : `${command}·s/${per}`;
}

/** Step of a nudge where the gain is too near zero for a percentage of it to be seen. */
const SMALLEST_STEP = 0.001;
const NEAR_ZERO = 1e-9;

/**
 * A gain moved by a fraction (0.01 is one per cent up) of its magnitude; where it is near 0, of the kept value's, and of one where
 * that is 0 too. Rounded to six significant figures so that up and down again does not leave a tail of digits.
 */
export function nudged(gain: Gain, settings: Settings, kept: Settings, fraction: number): number {
  const value = settings[gain];
  const near = Math.abs(value) < Math.max(NEAR_ZERO, 0.01 * Math.abs(kept[gain]));
  const size = near ? Math.abs(kept[gain]) || 1 : Math.abs(value);
  const step = fraction * size;
  const moved = value + (Math.abs(step) < SMALLEST_STEP * Math.abs(fraction) ? Math.sign(fraction) * SMALLEST_STEP : step);
  return clampGain(gain, roundedGain(moved));
}

/** Six significant figures: finer than any control unit takes, coarse enough to read back. */
export const roundedGain = (value: number): number => Number(value.toPrecision(6));
