import type { Curve } from './curve';
import { zeroBetween } from './knots';
import { NODES, NODE_COUNT, QUADRATURE } from './nodes';
import { evaluatePanel } from './panel-polynomial';

export interface Integrals {
  /** ∫|y − level| dt. */
  plain: number;
  /** ∫t·|y − level| dt. */
  timeWeighted: number;
}

/** The integrals over [0, end], each panel cut where the curve passes `level`. */
export function absoluteIntegrals(curve: Curve, level: number, end: number): Integrals {
  const integrals = { plain: 0, timeWeighted: 0 };
  for (let panel = 0; panel < curve.panels && curve.starts[panel] < end; panel += 1) {
    const isWhole = curve.starts[panel] + curve.widths[panel] <= end;
    if (isWhole && staysOnOneSide(curve, panel, level)) addWhole(integrals, curve, panel, level);
    else addInPieces(integrals, curve, panel, { level, end });
  }
  return integrals;
}

function staysOnOneSide({ values }: Curve, panel: number, level: number): boolean {
  const offset = panel * NODE_COUNT;
  const isAbove = values[offset] > level;
  for (let i = 1; i < NODE_COUNT; i += 1) if (values[offset + i] > level !== isAbove) return false;
  return true;
}

function addWhole(integrals: Integrals, { starts, widths, values }: Curve, panel: number, level: number): void {
  const offset = panel * NODE_COUNT;
  let area = 0;
  let moment = 0;
  for (let j = 0; j < NODE_COUNT; j += 1) {
    const share = QUADRATURE[j] * (values[offset + j] - level);
    area += share;
    moment += share * NODES[j];
  }
  integrals.plain += Math.abs(area) * widths[panel];
  integrals.timeWeighted += Math.abs(starts[panel] * area + widths[panel] * moment) * widths[panel];
}

function addInPieces(integrals: Integrals, curve: Curve, panel: number, { level, end }: { level: number; end: number }): void {
  const start = curve.starts[panel];
  const width = curve.widths[panel];
  const { coefficients } = curve;
  const deviation = (position: number) => evaluatePanel(coefficients, panel * NODE_COUNT, 2 * position - 1) - level;
  const cuts = [0, ...passages(deviation), 1].map((cut) => Math.min(cut, (end - start) / width));
  for (let k = 1; k < cuts.length; k += 1) {
    const length = cuts[k] - cuts[k - 1];
    for (let j = 0; j < NODE_COUNT; j += 1) {
      const position = cuts[k - 1] + length * NODES[j];
      const share = QUADRATURE[j] * length * width * Math.abs(deviation(position));
      integrals.plain += share;
      integrals.timeWeighted += share * (start + position * width);
    }
  }
}

function passages(deviation: (position: number) => number): number[] {
  const found: number[] = [];
  for (let i = 1; i < NODE_COUNT; i += 1) {
    if (deviation(NODES[i - 1]) * deviation(NODES[i]) < 0) found.push(zeroBetween(deviation, NODES[i - 1], NODES[i]));
  }
  return found;
}
