import type { Interval, Scale } from './geometry';

/** A logarithmic map of `domain` (above 0) onto `range`, and back. */
export function logScale([low, high]: Interval, [from, to]: Interval): { at: Scale; invert: Scale } {
  const slope = (to - from) / Math.log(high / low);
  return { at: (value) => from + Math.log(value / low) * slope, invert: (pixel) => low * Math.exp((pixel - from) / slope) };
}
