import type { Curve } from './curve';
import { NODES, NODE_COUNT } from './nodes';
import type { Band } from './settling';
import type { Simulation } from './simulation';
import { isResolved } from './resolution';
import type { Track } from './track';

/** A response counts as settled once it was watched for this multiple of the time, lest a slow mode lead out again. */
const WATCH_PER_SETTLING = 2.5;
const HORIZON_GROWTH = 1.5;

/** An unstable response is watched until it has grown tenfold, or for so many first swings where it hardly grows. */
export const GROWN = 10;
const SWINGS = 60;

/** An unstable response whose input does not wake what is unstable is watched for so many times the time it takes to rest. */
const WATCH_PER_REST = 50;
const RESTING = 1e-6;

/** Changes below this share of a curve's size are rounding, not motion. */
const MOTION = 1e-9;

/** Past this many first horizons, time itself has no digits left beside the first panels. */
const LONGEST = 1e15;

/** Panels of time that one response may fill. */
const MAX_PANELS = 60_000;

/** An output beyond this many times the step is no longer followed. */
const MAX_SIZE = 1e100;

/** Why a response is not given. `coarse`: panels too wide for what was found; `long`: too much work; `boundless`: too large. */
export type Failure = 'coarse' | 'long' | 'boundless';

/** A response that can be followed further: what judging one asks of its simulation. */
export type Running = Pick<Simulation, 'output' | 'control' | 'panels' | 'advanceTo'>;

/** Whether the output up to `horizon` shows enough. */
export type Enough = (output: Curve, horizon: number) => boolean;

/** Simulates on and on, each time half as far again, until enough was seen; answers how far that is. */
export function simulateUntil(simulation: Running, firstHorizon: number, enough: Enough): number | Failure {
  for (let horizon = firstHorizon; horizon < LONGEST * firstHorizon; horizon *= HORIZON_GROWTH) {
    const failure = simulateTo(simulation, horizon);
    if (failure) return failure;
    if (enough(simulation.output, horizon)) return horizon;
  }
  return 'long';
}

/** Simulates up to `horizon`, and says if that failed. */
export function simulateTo(simulation: Running, horizon: number): Failure | null {
  const known = simulation.panels;
  const arrived = simulation.advanceTo(horizon, { panels: MAX_PANELS, size: MAX_SIZE });
  if (!(simulation.output.size < MAX_SIZE && simulation.control.size < MAX_SIZE)) return 'boundless';
  if (!isResolved(simulation.output, known) || !isResolved(simulation.control, known)) return 'coarse';
  return arrived ? null : 'long';
}

/** Whether a track's delay line alone would cost more than a response may. */
export const isTooFine = (track: Track): boolean => track.panels < Infinity && track.panels > MAX_PANELS;

/** Enough of a stable response: it settled, and was watched long enough after. `bandFor` gives the band for a peak. */
export function hasSettled(bandFor: (peak: number) => Band): Enough {
  return (output, horizon) => {
    const { centre, band } = bandFor(output.size);
    for (let k = output.nodes - 1; k >= 0; k -= 1) {
      if (Math.abs(output.values[k] - centre) > band) return horizon >= WATCH_PER_SETTLING * nodeTime(output, k + 1);
    }
    return output.size > 0;
  };
}

/** Enough of an unstable response: ten times the unit step, many swings at a size that hardly grows, or a long rest. */
export function hasGrown(output: Curve, horizon: number): boolean {
  return firstAsLarge(output, GROWN) < horizon || horizon >= SWINGS * firstTurn(output) || hasRested(output, horizon);
}

/** Whether the output came to stand still and stood for long: its input does not wake what is unstable. */
function hasRested(output: Curve, horizon: number): boolean {
  const { values, size, nodes } = output;
  const end = values[nodes - 1];
  let resting = nodes - 1;
  while (resting > 0 && Math.abs(values[resting - 1] - end) <= RESTING * size) resting -= 1;
  return size > 0 && horizon >= WATCH_PER_REST * nodeTime(output, resting);
}

/** The time of the first node at which the curve is as large as that; Infinity where none is. */
function firstAsLarge(curve: Curve, size: number): number {
  let k = 0;
  while (k < curve.nodes && Math.abs(curve.values[k]) < size) k += 1;
  return nodeTime(curve, k);
}

/** The first node after which the curve turns back; Infinity where it never does. */
function firstTurn(curve: Curve): number {
  let direction = 0;
  for (let k = 1; k < curve.nodes; k += 1) {
    const change = curve.values[k] - curve.values[k - 1];
    if (Math.abs(change) <= MOTION * curve.size) continue;
    if (direction !== 0 && Math.sign(change) === -direction) return nodeTime(curve, k - 1);
    direction = Math.sign(change);
  }
  return Infinity;
}

/** The time of the k-th node of all; past the last one, never. */
function nodeTime(curve: Curve, k: number): number {
  const panel = Math.floor(k / NODE_COUNT);
  return panel < curve.panels ? curve.starts[panel] + curve.widths[panel] * NODES[k % NODE_COUNT] : Infinity;
}
