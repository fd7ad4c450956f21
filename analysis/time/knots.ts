import { bracketedRoot } from '@/analysis/numbers/bracketed-root';
import type { Curve } from './curve';
import { NODES, NODE_COUNT } from './nodes';
import { evaluatePanel, isSurelyMonotone, slopeOfPanel } from './panel-polynomial';

/** A panel whose values differ by less than this share of the curve's size is flat: its turns would be rounding. */
const FLAT = 1e-11;

/** A curve's times and values such that it is monotone from each knot to the next. At a jump two knots share a time. */
export interface Knots {
  readonly times: readonly number[];
  readonly values: readonly number[];
}

interface GrowingKnots {
  readonly times: number[];
  readonly values: number[];
}

/** The knots of `curve` on [0, end]: both ends of every panel and, where it turns, its nodes and its turning points. */
export function monotoneKnots(curve: Curve, end: number): Knots {
  const knots: GrowingKnots = { times: [], values: [] };
  for (let panel = 0; panel < curve.panels && curve.starts[panel] < end; panel += 1) {
    const offset = panel * NODE_COUNT;
    if (isSurelyMonotone(curve.coefficients, offset) || isFlat(curve, offset)) {
      knots.times.push(curve.starts[panel], curve.starts[panel] + curve.widths[panel]);
      knots.values.push(curve.values[offset], curve.values[offset + NODE_COUNT - 1]);
    } else addTurningPanel(curve, panel, knots);
  }
  return cutAt(curve, knots, end);
}

function addTurningPanel(curve: Curve, panel: number, { times, values }: GrowingKnots): void {
  const [start, width, offset] = [curve.starts[panel], curve.widths[panel], panel * NODE_COUNT];
  const { coefficients } = curve;
  const slopeAt = (position: number) => slopeOfPanel(coefficients, offset, 2 * position - 1);
  let slopeBefore = 0;
  for (let i = 0; i < NODE_COUNT; i += 1) {
    const slope = slopeAt(NODES[i]);
    if (slopeBefore * slope < 0) {
      const turn = zeroBetween(slopeAt, NODES[i - 1], NODES[i]);
      times.push(start + turn * width);
      values.push(evaluatePanel(coefficients, offset, 2 * turn - 1));
    }
    times.push(start + NODES[i] * width);
    values.push(curve.values[offset + i]);
    slopeBefore = slope;
  }
}

/** Knots until `end`, the last one at `end` itself. */
function cutAt(curve: Curve, { times, values }: GrowingKnots, end: number): Knots {
  while (times.length && times[times.length - 1] >= end) {
    times.pop();
    values.pop();
  }
  times.push(end);
  values.push(curve.valueBefore(end));
  return { times, values };
}

function isFlat(curve: Curve, offset: number): boolean {
  let low = Infinity;
  let high = -Infinity;
  for (let i = 0; i < NODE_COUNT; i += 1) {
    low = Math.min(low, curve.values[offset + i]);
    high = Math.max(high, curve.values[offset + i]);
  }
  return high - low <= FLAT * curve.size;
}

/** A zero of f between a and b; where rounding leaves f one sign there, the end at which it is smaller. */
export function zeroBetween(f: (x: number) => number, a: number, b: number): number {
  const fa = f(a);
  const fb = f(b);
  if (fa > 0 === fb > 0) return Math.abs(fa) < Math.abs(fb) ? a : b;
  return bracketedRoot(f, { a, fa, b, fb });
}
