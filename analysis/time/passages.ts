import type { Curve } from './curve';
import { zeroBetween, type Knots } from './knots';

/** The first time at which the curve, at rest at 0 before the step, reaches `level`; null if it never does. */
export function firstPassage(curve: Curve, { times, values }: Knots, level: number): number | null {
  if (level * (values[0] - level) >= 0) return 0;
  for (let i = 1; i < times.length; i += 1) {
    if ((values[i - 1] - level) * (values[i] - level) <= 0) return crossing(curve, [times[i - 1], times[i]], level);
  }
  return null;
}

/** The last time at which the curve is farther than `band` from `centre`; 0 if it never is, null if it still is at the end. */
export function lastOutside(curve: Curve, { times, values }: Knots, { centre, band }: { centre: number; band: number }): number | null {
  const last = times.length - 1;
  for (let i = last; i >= 0; i -= 1) {
    const deviation = values[i] - centre;
    if (Math.abs(deviation) <= band) continue;
    return i === last ? null : crossing(curve, [times[i], times[i + 1]], centre + Math.sign(deviation) * band);
  }
  return 0;
}

/** Where a monotone stretch passes `level`; a jump passes it at once. */
function crossing(curve: Curve, [from, to]: readonly [number, number], level: number): number {
  if (from === to) return from;
  const panel = curve.panelAt((from + to) / 2);
  return zeroBetween((time) => curve.valueIn(panel, time) - level, from, to);
}

/** The knot farthest in the direction of `sign` (±1): the time and the value there. */
export function extreme({ times, values }: Knots, sign: number): { time: number; value: number } {
  let best = 0;
  for (let i = 1; i < values.length; i += 1) if (sign * values[i] > sign * values[best]) best = i;
  return { time: times[best] ?? 0, value: values[best] ?? 0 };
}

/** The greatest magnitude. */
export const peakOf = (knots: Knots): number => Math.max(Math.abs(extreme(knots, 1).value), Math.abs(extreme(knots, -1).value));
