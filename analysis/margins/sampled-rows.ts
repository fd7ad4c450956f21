import type { LoopFunction } from './loop-function';
import { ROW, type Table } from './sample';

/** A growing table of samples, in the order in which they were asked for. */
export class SampledRows {
  table: Table;
  private end = 0;

  constructor(
    private readonly loop: LoopFunction,
    rows: number,
  ) {
    this.table = new Float64Array(rows * ROW);
  }

  /** Samples the loop at ω and answers where that row begins. */
  add(omega: number): number {
    const row = this.end;
    if (row === this.table.length) this.grow();
    this.loop.sampleAt(omega, this.table, row);
    this.end += ROW;
    return row;
  }

  private grow(): void {
    const table = new Float64Array(2 * this.table.length);
    table.set(this.table);
    this.table = table;
  }
}
