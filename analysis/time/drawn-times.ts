import type { Curve } from './curve';
import { derivativeAtNodes, NODE_COUNT } from './nodes';
import { bendBound, slopeOfPanel } from './panel-polynomial';

/** Straight lines between drawn points stay within this share of a curve's range. */
const DRAWING_TOLERANCE = 2.5e-4;
const LOOSER = 3;
const MAX_POINTS = 4000;

/** How long before a jump its foot is drawn, and the least distance of two points, as shares of the axis. */
const INSTANT = 1e-9;

/**
 * Ascending times on [0, end], both included, at which to draw the curves: at least `points` evenly spread, more where a
 * curve bends, and a pair about each jump. Where that came to more than 4,000 the tolerance is loosened.
 */
export function drawnTimes(curves: readonly Curve[], end: number, points: number): number[] {
  const even = new Array<number>(points);
  for (let k = 0; k < points; k += 1) even[k] = (end * k) / (points - 1);
  for (let tolerance = DRAWING_TOLERANCE; tolerance < 1; tolerance *= LOOSER) {
    const extra = curves.flatMap((curve) => bendTimes(curve, { end, spacing: end / (points - 1), tolerance }));
    const times = merged(
      even,
      extra.sort((a, b) => a - b),
      end,
    );
    if (times.length <= Math.max(points, MAX_POINTS)) return times;
  }
  return even;
}

interface Drawing {
  readonly end: number;
  readonly spacing: number;
  readonly tolerance: number;
}

function bendTimes(curve: Curve, { end, spacing, tolerance }: Drawing): number[] {
  const times: number[] = [];
  const allowed = tolerance * rangeUntil(curve, end);
  const { coefficients } = curve;
  let [before, slopeBefore] = [curve.values[0], 0];
  for (let panel = 0; panel < curve.panels && curve.starts[panel] < end && times.length <= MAX_POINTS; panel += 1) {
    const [start, width, offset] = [curve.starts[panel], curve.widths[panel], panel * NODE_COUNT];
    const perTime = 2 / width;
    if (Math.abs(curve.values[offset] - before) > allowed) times.push(start - INSTANT * end, start);
    else if ((Math.abs(perTime * slopeOfPanel(coefficients, offset, -1) - slopeBefore) * spacing) / 4 > allowed) times.push(start);
    before = curve.values[offset + NODE_COUNT - 1];
    slopeBefore = perTime * slopeOfPanel(coefficients, offset, 1);
    const steepest = (8 * allowed) / (spacing * spacing * perTime * perTime);
    if (bendBound(coefficients, offset) <= steepest) continue;
    const pieces = Math.ceil(Math.sqrt(greatestBend(curve, panel) / (8 * allowed)));
    if (width / pieces < spacing) for (let k = 0; k <= pieces; k += 1) times.push(start + (width * k) / pieces);
  }
  return times;
}

/** The greatest second derivative at a panel's nodes, per square of its width. */
function greatestBend({ values }: Curve, panel: number): number {
  derivativeAtNodes(values, panel * NODE_COUNT, slopes);
  derivativeAtNodes(slopes, 0, bends);
  let most = 0;
  for (let i = 0; i < NODE_COUNT; i += 1) most = Math.max(most, Math.abs(bends[i]));
  return most;
}

/** Room for what `greatestBend` reads. */
const [slopes, bends] = [new Float64Array(NODE_COUNT), new Float64Array(NODE_COUNT)];

function rangeUntil(curve: Curve, end: number): number {
  let size = Number.MIN_VALUE;
  for (let panel = 0; panel < curve.panels && curve.starts[panel] < end; panel += 1) {
    for (let j = 0; j < NODE_COUNT; j += 1) size = Math.max(size, Math.abs(curve.values[panel * NODE_COUNT + j]));
  }
  return size;
}

/** Two ascending lists as one from 0 to `end`, nearer neighbours than an instant told once. */
function merged(even: readonly number[], extra: readonly number[], end: number): number[] {
  const apart = (INSTANT * end) / 2;
  const times: number[] = [];
  for (let [i, j] = [0, 0]; i < even.length || j < extra.length;) {
    const time = j >= extra.length || even[i] <= extra[j] ? even[i++] : extra[j++];
    const isNew = times.length === 0 || time - times[times.length - 1] > apart;
    if (isNew && time >= 0 && time < end - apart) times.push(time);
  }
  times.push(end);
  return times;
}
