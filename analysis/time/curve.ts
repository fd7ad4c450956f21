import { NODE_COUNT, interpolate } from './nodes';

/**
 * A signal over time as panels, each a polynomial through its values at NODES. Jumps stand between panels: the value at
 * a panel's start is the one just after. Grows at its end while it is simulated.
 */
export class Curve {
  readonly starts: number[] = [];
  readonly widths: number[] = [];
  readonly values: number[] = [];
  /** The greatest magnitude at any node so far. */
  size = 0;

  get panels(): number {
    return this.starts.length;
  }

  get end(): number {
    const last = this.panels - 1;
    return last < 0 ? 0 : this.starts[last] + this.widths[last];
  }

  /** Appends a panel whose node values stand in `source` from `offset`. */
  append({ start, width }: { start: number; width: number }, source: ArrayLike<number>, offset: number): void {
    this.starts.push(start);
    this.widths.push(width);
    for (let i = 0; i < NODE_COUNT; i += 1) {
      const value = source[offset + i];
      this.values.push(value);
      this.size = Math.max(this.size, Math.abs(value));
    }
  }

  /** The panel that holds `time`; at a boundary the later one. */
  panelAt(time: number): number {
    let low = 0;
    let high = this.panels - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (this.starts[middle] <= time) low = middle;
      else high = middle - 1;
    }
    return low;
  }

  valueAt(time: number): number {
    return this.valueIn(this.panelAt(time), time);
  }

  /** The value just before `time`, which differs from the value at it where the curve jumps. */
  valueBefore(time: number): number {
    const panel = this.panelAt(time);
    return this.valueIn(panel > 0 && this.starts[panel] === time ? panel - 1 : panel, time);
  }

  /** The values at ascending times. */
  valuesAt(times: readonly number[]): number[] {
    let panel = 0;
    return times.map((time) => {
      while (panel + 1 < this.panels && this.starts[panel + 1] <= time) panel += 1;
      return this.valueIn(panel, time);
    });
  }

  /** The polynomial of one panel, also at the panel's ends. */
  valueIn(panel: number, time: number): number {
    return interpolate(this.values, panel * NODE_COUNT, (time - this.starts[panel]) / this.widths[panel]);
  }
}
