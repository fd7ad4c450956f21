import type { Curve } from './curve';
import { interpolate, NODES, NODE_COUNT } from './nodes';

/** Wider panels must give the curve back within this share of its size. */
const FAITHFUL = 1e-9;

/**
 * The node values of the curve's last `count` panels' worth of time, cut anew into panels of `width`; null where such
 * panels do not give the curve back, or where it is shorter than that.
 */
export function renode(curve: Curve, width: number, count: number): Float64Array | null {
  const from = curve.end - count * width;
  if (from < 0) return null;
  const values = new Float64Array(count * NODE_COUNT);
  for (let panel = 0; panel < count; panel += 1) {
    NODES.forEach((node, i) => (values[panel * NODE_COUNT + i] = curve.valueBefore(from + (panel + node) * width)));
  }
  for (let panel = curve.panelAt(from) + 1; panel < curve.panels; panel += 1) {
    for (let i = 0; i < NODE_COUNT; i += 1) {
      const place = (curve.starts[panel] + NODES[i] * curve.widths[panel] - from) / width;
      const target = Math.min(Math.floor(place), count - 1);
      const given = interpolate(values, target * NODE_COUNT, place - target);
      if (Math.abs(given - curve.values[panel * NODE_COUNT + i]) > FAITHFUL * curve.size) return null;
    }
  }
  return values;
}
