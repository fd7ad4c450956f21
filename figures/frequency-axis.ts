import { range } from 'd3-array';
import { shortNumber } from './format';
import type { Interval, Scale } from './geometry';
import { logScale } from './log-scale';
import { textWidth } from './text-width';
import { frequencyFrom, frequencyIn, type FrequencyUnit } from './units';

export interface FrequencyTick {
  /** rad/s */
  readonly frequency: number;
  readonly x: number;
  /** Null for a tick without a label. */
  readonly text: string | null;
}

export interface FrequencyAxis {
  /** rad/s */
  readonly domain: Interval;
  readonly unit: FrequencyUnit;
  readonly at: Scale;
  /** Pixel → rad/s. */
  readonly invert: Scale;
  readonly labelled: readonly FrequencyTick[];
  /** The other integers of each decade, as on a slide rule. */
  readonly minor: readonly FrequencyTick[];
}

const LABEL_GAP = 10;
/** Which integers of a decade are named, from most to fewest, and every how many decades. */
const DENSITIES: readonly { digits: readonly number[]; decades: number }[] = [
  { digits: [1, 2, 5], decades: 1 },
  { digits: [1], decades: 1 },
  { digits: [1], decades: 2 },
  { digits: [1], decades: 3 },
  { digits: [1], decades: 6 },
];

/** The integers times powers of ten inside an interval, ascending. */
function decadeIntegers([low, high]: Interval): { value: number; digit: number; exponent: number }[] {
  const exponents = range(Math.floor(Math.log10(low) - 1e-9), Math.floor(Math.log10(high) + 1e-9) + 1);
  return exponents
    .flatMap((exponent) => range(1, 10).map((digit) => ({ value: Number(`${digit}e${exponent}`), digit, exponent })))
    .filter(({ value }) => value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9));
}

function fits(labels: readonly FrequencyTick[]): boolean {
  return labels.every((label, i) => {
    if (i === 0) return true;
    const previous = labels[i - 1];
    return label.x - previous.x >= (textWidth(label.text ?? '') + textWidth(previous.text ?? '')) / 2 + LABEL_GAP;
  });
}

/**
 * The logarithmic frequency axis over `domain` (rad/s), drawn into `pixels`. Labels are round in the reader's unit:
 * 0.1 0.2 0.5 1 2 5 …, thinned out to whole decades where they would touch.
 */
export function frequencyAxis(domain: Interval, pixels: Interval, unit: FrequencyUnit): FrequencyAxis {
  const { at, invert } = logScale(domain, pixels);
  const integers = decadeIntegers([frequencyIn(unit, domain[0]), frequencyIn(unit, domain[1])]);
  const tick = (value: number, text: string | null): FrequencyTick => {
    const frequency = frequencyFrom(unit, value);
    return { frequency, x: at(frequency), text };
  };
  const named = DENSITIES.map(({ digits, decades }) => integers.filter((n) => digits.includes(n.digit) && n.exponent % decades === 0));
  const candidates = named.map((list) => list.map((n) => tick(n.value, shortNumber(n.value, 1))));
  const labelled = candidates.find(fits) ?? candidates[candidates.length - 1];
  const taken = new Set(labelled.map((label) => label.frequency));
  const dense = (pixels[1] - pixels[0]) / Math.log10(domain[1] / domain[0]) > 40;
  const minor = integers
    .filter((n) => dense || n.digit === 1)
    .map((n) => tick(n.value, null))
    .filter((t) => !taken.has(t.frequency));
  return { domain, unit, at, invert, labelled, minor };
}
