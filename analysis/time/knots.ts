import type { Curve } from './curve';
import { derivativeAtNodes, interpolate, NODES, NODE_COUNT } from './nodes';

/** A panel whose values differ by less than this share of the curve's size is flat: its turns would be rounding. */
const FLAT = 1e-11;
const BISECTIONS = 48;

/** A curve's times and values such that it is monotone from each knot to the next. At a jump two knots share a time. */
export interface Knots {
  readonly times: readonly number[];
  readonly values: readonly number[];
}

/** The knots of `curve` on [0, end]: panel nodes and, between them, every turning point, refined on the polynomial. */
export function monotoneKnots(curve: Curve, end: number): Knots {
  const times: number[] = [];
  const values: number[] = [];
  const room = new Float64Array(NODE_COUNT);
  for (let panel = 0; panel < curve.panels && curve.starts[panel] < end; panel += 1) {
    const [start, width, offset] = [curve.starts[panel], curve.widths[panel], panel * NODE_COUNT];
    const slopes = isFlat(curve, offset) ? null : derivativeAtNodes(curve.values, offset, room);
    for (let i = 0; i < NODE_COUNT; i += 1) {
      if (slopes && i > 0 && slopes[i - 1] * slopes[i] < 0) {
        const turn = zeroBetween((x) => interpolate(slopes, 0, x), NODES[i - 1], NODES[i]);
        times.push(start + turn * width);
        values.push(interpolate(curve.values, offset, turn));
      }
      times.push(start + NODES[i] * width);
      values.push(curve.values[offset + i]);
    }
  }
  return cutAt(curve, { times, values }, end);
}

/** Knots until `end`, the last one at `end` itself. */
function cutAt(curve: Curve, { times, values }: { times: number[]; values: number[] }, end: number): Knots {
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

/** A zero of f between a and b, where f has opposite signs or one is zero, by bisection. */
export function zeroBetween(f: (x: number) => number, a: number, b: number): number {
  const positiveAtB = f(b) > 0;
  let [low, high] = [a, b];
  for (let k = 0; k < BISECTIONS; k += 1) {
    const middle = (low + high) / 2;
    if (f(middle) > 0 === positiveAtB) high = middle;
    else low = middle;
  }
  return high;
}
