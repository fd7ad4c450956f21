import type { Curve } from './curve';
import { monotoneKnots, turningTimes, type Knots } from './knots';
import { extreme, lastOutside } from './passages';
import { isResolved } from './resolution';
import type { Simulation } from './simulation';

/** Settled is what stays within this share of the final value; of the peak, where the final value is 0. */
export const SETTLING_BAND = 0.02;

/** A final value below this share of the peak is 0 but for rounding. */
const NEGLIGIBLE = 1e-9;

/** The axis is this multiple of the settling time: between the 1.25 and 2 that numerics.md allows. */
const AXIS_PER_SETTLING = 1.6;

/** A response counts as settled once it was watched for this multiple of the time, lest a slow mode lead out again. */
const WATCH_PER_SETTLING = 2.5;
const HORIZON_GROWTH = 1.5;

/** An unstable response is shown until it has grown tenfold, or for so many first swings where it hardly grows. */
const GROWN = 10;
const SWINGS = 60;

/** `coarse`: panels too wide for what was found; `long`: more panels than the work allows. */
export type Simulated =
  { readonly outcome: 'done'; readonly axisEnd: number; readonly horizon: number } | { readonly outcome: 'coarse' | 'long' };

export const peakOf = (knots: Knots): number => Math.max(Math.abs(extreme(knots, 1).value), Math.abs(extreme(knots, -1).value));

/** The band that `final` and `peak` give, and the value it is about. */
export function settlingBand(final: number, peak: number): { centre: number; band: number } {
  const vanishes = Math.abs(final) <= NEGLIGIBLE * peak;
  return { centre: vanishes ? 0 : final, band: SETTLING_BAND * (vanishes ? peak : Math.abs(final)) };
}

interface Watch {
  readonly firstHorizon: number;
  readonly maxPanels: number;
  /** The axis' end if `knots` up to `horizon` show enough, otherwise null. */
  enough(knots: Knots, horizon: number): number | null;
}

/** Simulates on and on, each time half as far again, until enough was seen. */
export function simulateUntil(simulation: Simulation, { firstHorizon, maxPanels, enough }: Watch): Simulated {
  for (let horizon = firstHorizon; ; horizon *= HORIZON_GROWTH) {
    const arrived = simulation.advanceTo(horizon, maxPanels);
    if (!isResolved(simulation.output) || !isResolved(simulation.control)) return { outcome: 'coarse' };
    if (!arrived) return { outcome: 'long' };
    const axisEnd = enough(monotoneKnots(simulation.output, horizon), horizon);
    if (axisEnd !== null) return { outcome: 'done', axisEnd, horizon };
  }
}

/** Enough of a stable response: it settled, and was watched long enough after. `bandOf` gives the band for a peak. */
export function untilSettled(curve: Curve, bandOf: (peak: number) => { centre: number; band: number }): Watch['enough'] {
  return (knots, horizon) => {
    const peak = peakOf(knots);
    const settling = peak === 0 ? null : lastOutside(curve, knots, bandOf(peak));
    if (settling === null || horizon < WATCH_PER_SETTLING * settling) return null;
    return settling === 0 ? horizon : AXIS_PER_SETTLING * settling;
  };
}

/** Enough of an unstable response: ten times the step, or many swings at a size that hardly grows. */
export function untilGrown(knots: Knots, horizon: number): number | null {
  const grownAt = knots.values.findIndex((value) => Math.abs(value) >= GROWN);
  if (grownAt >= 0) return knots.times[grownAt] || horizon;
  const [firstTurn] = turningTimes(knots);
  return firstTurn > 0 && horizon >= SWINGS * firstTurn ? horizon : null;
}
