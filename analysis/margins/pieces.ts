import type { Probe } from './probe';
import type { Quantity } from './quantities';

/** A stretch of the axis on which a quantity only rises or only falls. */
export interface Piece {
  readonly a: number;
  readonly valueA: number;
  readonly b: number;
  readonly valueB: number;
}

/**
 * Visits the axis from low to high in pieces on which `quantity` is monotone. An interval of the grid whose slopes differ
 * in sign holds a turning point; it is found exactly and the interval visited in two pieces, but only where `matters`
 * says that what lies between could (it is told the least and the most that the interval reaches). Stretches with an undamped pole
 * or zero are left out. `visit` returns true to stop.
 */
export const visitPieces = (
  probe: Probe,
  quantity: Quantity,
  { matters, visit }: { matters: (least: number, most: number, interval: number) => boolean; visit: (piece: Piece) => boolean | void },
): void => {
  for (let i = 0; i < probe.count - 1; i += 1) {
    const valueA = probe.valueAt(i, quantity);
    const valueB = probe.valueAt(i + 1, quantity);
    const slopeA = probe.slopeAt(i, quantity);
    const slopeB = probe.slopeAt(i + 1, quantity);
    const turns = slopeA > 0 !== slopeB > 0 && slopeA !== 0 && slopeB !== 0;
    let least = Math.min(valueA, valueB);
    let most = Math.max(valueA, valueB);
    if (turns) {
      // A single bend stays within its tangents at both ends.
      const width = Math.log(probe.frequencyAt(i + 1) / probe.frequencyAt(i));
      const fromA = valueA + slopeA * width;
      const fromB = valueB - slopeB * width;
      least = Math.min(least, Math.max(fromA, fromB));
      most = Math.max(most, Math.min(fromA, fromB));
    }
    if (!matters(least, most, i) || probe.jumps(i)) continue;
    const a = probe.frequencyAt(i);
    const b = probe.frequencyAt(i + 1);
    if (!turns) {
      if (visit({ a, valueA, b, valueB })) return;
      continue;
    }
    const middle = probe.stationary(quantity, i);
    const value = probe.found[quantity];
    if (visit({ a, valueA, b: middle, valueB: value }) || visit({ a: middle, valueA: value, b, valueB })) return;
  }
};
