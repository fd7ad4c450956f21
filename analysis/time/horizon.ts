import type { Curve } from './curve';
import { NODES, NODE_COUNT } from './nodes';
import type { Band } from './settling';
import type { Simulation } from './simulation';
import { isResolved } from './resolution';

/** A response counts as settled once it was watched for this multiple of the time, lest a slow mode lead out again. */
const WATCH_PER_SETTLING = 2.5;
const HORIZON_GROWTH = 1.5;

/** An unstable response is watched until it has grown tenfold, or for so many first swings where it hardly grows. */
export const GROWN = 10;
const SWINGS = 60;

/** `coarse`: panels too wide for what was found; `long`: more panels than the work allows. */
export type Watched = { readonly outcome: 'done'; readonly horizon: number } | { readonly outcome: 'coarse' | 'long' };

interface Watch {
  readonly firstHorizon: number;
  readonly maxPanels: number;
  /** Whether the output up to `horizon` shows enough. */
  enough(output: Curve, horizon: number): boolean;
}

/** Simulates on and on, each time half as far again, until enough was seen. */
export function simulateUntil(simulation: Simulation, { firstHorizon, maxPanels, enough }: Watch): Watched {
  for (let horizon = firstHorizon; ; horizon *= HORIZON_GROWTH) {
    const known = simulation.panels;
    const arrived = simulation.advanceTo(horizon, maxPanels);
    if (!isResolved(simulation.output, known) || !isResolved(simulation.control, known)) return { outcome: 'coarse' };
    if (!arrived) return { outcome: 'long' };
    if (enough(simulation.output, horizon)) return { outcome: 'done', horizon };
  }
}

/** Enough of a stable response: it settled, and was watched long enough after. `bandFor` gives the band for a peak. */
export function hasSettled(bandFor: (peak: number) => Band): Watch['enough'] {
  return (output, horizon) => {
    const { centre, band } = bandFor(output.size);
    for (let k = output.values.length - 1; k >= 0; k -= 1) {
      if (Math.abs(output.values[k] - centre) > band) return horizon >= WATCH_PER_SETTLING * nodeTime(output, k + 1);
    }
    return output.size > 0;
  };
}

/** Enough of an unstable response: ten times the unit step, or many swings at a size that hardly grows. */
export function hasGrown(output: Curve, horizon: number): boolean {
  return output.size >= GROWN || horizon >= SWINGS * firstTurn(output);
}

/** The first node after which the curve turns back; Infinity where it never does. */
function firstTurn(curve: Curve): number {
  let direction = 0;
  for (let k = 1; k < curve.values.length; k += 1) {
    const now = Math.sign(curve.values[k] - curve.values[k - 1]);
    if (direction !== 0 && now === -direction) return nodeTime(curve, k - 1);
    if (now !== 0) direction = now;
  }
  return Infinity;
}

/** The time of the k-th node of all; past the last one, never. */
function nodeTime(curve: Curve, k: number): number {
  const panel = Math.floor(k / NODE_COUNT);
  return panel < curve.panels ? curve.starts[panel] + curve.widths[panel] * NODES[k % NODE_COUNT] : Infinity;
}
