import type { Curve } from './curve';
import { zeroBetween } from './knots';
import { interpolate, NODES, NODE_COUNT, QUADRATURE } from './nodes';

/** ∫|y − level| dt and ∫t·|y − level| dt over [0, end], each panel cut where the curve passes `level`. */
export function absoluteIntegrals(curve: Curve, level: number, end: number): { plain: number; timeWeighted: number } {
  let plain = 0;
  let timeWeighted = 0;
  for (let panel = 0; panel < curve.panels && curve.starts[panel] < end; panel += 1) {
    const start = curve.starts[panel];
    const width = curve.widths[panel];
    const deviation = (position: number) => interpolate(curve.values, panel * NODE_COUNT, position) - level;
    const cuts = [0, ...passages(deviation), 1].map((cut) => Math.min(cut, (end - start) / width));
    for (let k = 1; k < cuts.length; k += 1) {
      const length = cuts[k] - cuts[k - 1];
      for (let j = 0; j < NODE_COUNT; j += 1) {
        const position = cuts[k - 1] + length * NODES[j];
        const share = QUADRATURE[j] * length * width * Math.abs(deviation(position));
        plain += share;
        timeWeighted += share * (start + position * width);
      }
    }
  }
  return { plain, timeWeighted };
}

function passages(deviation: (position: number) => number): number[] {
  const found: number[] = [];
  for (let i = 1; i < NODE_COUNT; i += 1) {
    if (deviation(NODES[i - 1]) * deviation(NODES[i]) < 0) found.push(zeroBetween(deviation, NODES[i - 1], NODES[i]));
  }
  return found;
}
