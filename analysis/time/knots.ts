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
  const add = (time: number, value: number) => {
    times.push(time);
    values.push(value);
  };
  const size = curve.values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
  for (let panel = 0; panel < curve.panels && curve.starts[panel] < end; panel += 1) {
    const turns = turningPositions(curve, panel, size);
    const positions = [...NODES, ...turns].sort((a, b) => a - b);
    for (const position of positions) {
      const time = curve.starts[panel] + position * curve.widths[panel];
      if (time >= end) break;
      add(time, interpolate(curve.values, panel * NODE_COUNT, position));
    }
    if (curve.starts[panel] + curve.widths[panel] >= end) add(end, curve.valueIn(panel, end));
  }
  return { times, values };
}

/** Times at which the curve turns from rising to falling or back. */
export function turningTimes({ times, values }: Knots): number[] {
  const found: number[] = [];
  let direction = 0;
  for (let i = 1; i < values.length; i += 1) {
    const now = Math.sign(values[i] - values[i - 1]);
    if (direction !== 0 && now === -direction) found.push(times[i - 1]);
    if (now !== 0) direction = now;
  }
  return found;
}

function turningPositions(curve: Curve, panel: number, size: number): number[] {
  const offset = panel * NODE_COUNT;
  if (isFlat(curve, offset, size)) return [];
  const slopes = derivativeAtNodes(curve.values, offset);
  const turns: number[] = [];
  for (let i = 1; i < NODE_COUNT; i += 1) {
    if (slopes[i - 1] * slopes[i] < 0) turns.push(zeroBetween((x) => interpolate(slopes, 0, x), NODES[i - 1], NODES[i]));
  }
  return turns;
}

function isFlat(curve: Curve, offset: number, size: number): boolean {
  let low = Infinity;
  let high = -Infinity;
  for (let i = 0; i < NODE_COUNT; i += 1) {
    low = Math.min(low, curve.values[offset + i]);
    high = Math.max(high, curve.values[offset + i]);
  }
  return high - low <= FLAT * size;
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
