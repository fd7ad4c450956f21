import { bracketedRoot } from '@/analysis/numbers/bracketed-root';
import type { LoopFunction } from './loop-function';
import type { Quantity } from './quantities';
import { OMEGA, ROW, type Table } from './sample';

/**
 * Reads the exact loop between two rows of a grid. What it finds stands in its own row, valid until the next search.
 */
export class Probe {
  readonly row: Table = new Float64Array(ROW);
  constructor(
    private readonly loop: LoopFunction,
    readonly table: Table,
    readonly count: number,
  ) {}

  /** Samples the loop at ω into the probe's row. */
  moveTo(omega: number): void {
    this.loop.sampleAt(omega, this.row, 0);
  }

  /** L jumps somewhere between rows i and i + 1: an undamped pole or zero lies there. */
  jumps(i: number): boolean {
    const from = this.table[i * ROW + OMEGA];
    const to = this.table[(i + 1) * ROW + OMEGA];
    return this.loop.axisFrequencies.some((omega) => omega > from && omega < to);
  }

  /** Frequency between two others where `quantity` is stationary; its slopes there have different signs. */
  stationary(quantity: Quantity, ends: { a: number; slopeA: number; b: number; slopeB: number }): number {
    return this.settle({ a: ends.a, fa: ends.slopeA, b: ends.b, fb: ends.slopeB }, () => quantity.slope(this.row, 0));
  }

  /** Frequency between two others where `quantity` equals `level`; the given values lie on both sides of it. */
  crossing(quantity: Quantity, level: number, ends: { a: number; valueA: number; b: number; valueB: number }): number {
    const bracket = { a: ends.a, fa: ends.valueA - level, b: ends.b, fb: ends.valueB - level };
    return this.settle(bracket, () => quantity.value(this.row, 0) - level);
  }

  private settle(bracket: { a: number; fa: number; b: number; fb: number }, read: () => number): number {
    const omega = bracketedRoot((x) => {
      this.moveTo(x);
      return read();
    }, bracket);
    this.moveTo(omega);
    return omega;
  }
}
