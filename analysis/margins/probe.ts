import { bracketedRoot } from '@/analysis/numbers/bracketed-root';
import type { Grid } from './grid';
import type { LoopFunction } from './loop-function';
import { readQuantities, READINGS, SLOPE, type Quantity } from './quantities';
import { OMEGA, ROW, type Table } from './sample';

/**
 * Reads the exact loop on the rows of a grid and between two of them. What it finds between them stands in `found`, valid
 * until the next search.
 */
export class Probe {
  /** Every quantity at every row of the grid. */
  private readonly readings: Float64Array;
  /** The same where the probe stands. */
  readonly found = new Float64Array(READINGS);
  private readonly row: Table = new Float64Array(ROW);

  constructor(
    private readonly loop: LoopFunction,
    private readonly grid: Grid,
  ) {
    const { table, rows } = grid;
    this.readings = new Float64Array(rows.length * READINGS);
    for (let i = 0; i < rows.length; i += 1) readQuantities(table, rows[i], this.readings, i * READINGS);
  }

  /** Rows of the grid. */
  get count(): number {
    return this.grid.rows.length;
  }

  frequencyAt(i: number): number {
    return this.grid.table[this.grid.rows[i] + OMEGA];
  }

  valueAt(i: number, quantity: Quantity): number {
    return this.readings[i * READINGS + quantity];
  }

  slopeAt(i: number, quantity: Quantity): number {
    return this.readings[i * READINGS + quantity + SLOPE];
  }

  /** L jumps somewhere between rows i and i + 1: an undamped pole or zero lies there. */
  jumps(i: number): boolean {
    const from = this.frequencyAt(i);
    const to = this.frequencyAt(i + 1);
    return this.loop.axisFrequencies.some((omega) => omega > from && omega < to);
  }

  /** Frequency between rows i and i + 1 where `quantity` is stationary; its slopes there have different signs. */
  stationary(quantity: Quantity, i: number): number {
    const [a, b] = [this.frequencyAt(i), this.frequencyAt(i + 1)];
    return this.settle(quantity + SLOPE, 0, { a, fa: this.slopeAt(i, quantity), b, fb: this.slopeAt(i + 1, quantity) });
  }

  /** Frequency between two others where `quantity` equals `level`; the given values lie on both sides of it. */
  crossing(quantity: Quantity, level: number, ends: { a: number; valueA: number; b: number; valueB: number }): number {
    return this.settle(quantity, level, { a: ends.a, fa: ends.valueA - level, b: ends.b, fb: ends.valueB - level });
  }

  private settle(place: number, level: number, bracket: { a: number; fa: number; b: number; fb: number }): number {
    let last = NaN;
    const read = (omega: number) => {
      last = omega;
      this.loop.sampleAt(omega, this.row, 0);
      readQuantities(this.row, 0, this.found, 0);
      return this.found[place] - level;
    };
    const omega = bracketedRoot(read, bracket);
    if (omega !== last) read(omega);
    return omega;
  }
}
