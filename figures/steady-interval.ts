import type { Interval } from './geometry';

/** How much wider than wanted an interval may be before it is drawn in. */
const SLACK = 1.6;

/**
 * Keeps the interval that is drawn while the wanted one lies inside it and fills most of it, so that axes stand still
 * while a gain moves. `measure` is the axis' own scale: Math.log10 for frequencies, the value itself for times.
 */
export function steadyInterval(drawn: Interval | null, wanted: Interval, measure: (value: number) => number): Interval {
  if (drawn === null) return wanted;
  const [a, b] = drawn.map(measure);
  const [c, d] = wanted.map(measure);
  const slack = 1e-9 * (d - c);
  const inside = c >= a - slack && d <= b + slack;
  return inside && b - a <= SLACK * (d - c) ? drawn : wanted;
}
