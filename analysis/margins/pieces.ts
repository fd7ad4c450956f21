import type { Probe } from './probe';
import type { Quantity } from './quantities';
import { OMEGA, ROW } from './sample';

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
 * says that what lies between could (it is told the least and the most that the interval reaches). Stretches with an undamped pole or zero are left out. `visit` returns true to stop.
 */
export const visitPieces = (
  probe: Probe,
  quantity: Quantity,
  { matters, visit }: { matters: (least: number, most: number, interval: number) => boolean; visit: (piece: Piece) => boolean | void },
): void => {
  const { table, count } = probe;
  for (let i = 0; i < count - 1; i += 1) {
    const row = i * ROW;
    const next = row + ROW;
    const a = table[row + OMEGA];
    const b = table[next + OMEGA];
    const valueA = quantity.value(table, row);
    const valueB = quantity.value(table, next);
    const slopeA = quantity.slope(table, row);
    const slopeB = quantity.slope(table, next);
    const turns = slopeA > 0 !== slopeB > 0 && slopeA !== 0 && slopeB !== 0;
    const [least, most] = turns ? reach({ a, valueA, slopeA, b, valueB, slopeB }) : [Math.min(valueA, valueB), Math.max(valueA, valueB)];
    if (!matters(least, most, i) || probe.jumps(i)) continue;
    if (!turns) {
      if (visit({ a, valueA, b, valueB })) return;
      continue;
    }
    const middle = probe.stationary(quantity, { a, slopeA, b, slopeB });
    const value = quantity.value(probe.row, 0);
    if (visit({ a, valueA, b: middle, valueB: value }) || visit({ a: middle, valueA: value, b, valueB })) return;
  }
};

/** Bounds on a quantity between two rows: its tangents there, which a single bend does not leave. */
const reach = ({ a, valueA, slopeA, b, valueB, slopeB }: Piece & { slopeA: number; slopeB: number }): [number, number] => {
  const width = Math.log(b / a);
  const fromA = valueA + slopeA * width;
  const fromB = valueB - slopeB * width;
  return [Math.min(valueA, valueB, Math.max(fromA, fromB)), Math.max(valueA, valueB, Math.min(fromA, fromB))];
};
