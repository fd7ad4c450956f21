import { NODE_COUNT } from './nodes';
import { evaluatePanel, fitPanel } from './panel-polynomial';

/** Panels that a curve has room for once it has any. */
const FIRST_ROOM = 96;
const ROOM_GROWTH = 3;

/**
 * A signal over time as panels, each a polynomial through its values at NODES. Jumps stand between panels: the value at
 * a panel's start is the one just after. Grows at its end while it is simulated.
 */
export class Curve {
  /** Where panels start, how wide they are and their node values; only what belongs to the first `panels` of them counts. */
  starts: Float64Array = new Float64Array(0);
  widths: Float64Array = new Float64Array(0);
  values: Float64Array = new Float64Array(0);
  panels = 0;
  /** The greatest magnitude at any node so far. */
  size = 0;
  private fitted = 0;
  private fits: Float64Array = new Float64Array(0);

  get end(): number {
    const last = this.panels - 1;
    return last < 0 ? 0 : this.starts[last] + this.widths[last];
  }

  /** How many node values there are. */
  get nodes(): number {
    return this.panels * NODE_COUNT;
  }

  /** Every panel's polynomial in x from −1 to 1, NODE_COUNT coefficients each. */
  get coefficients(): Float64Array {
    if (this.fitted < this.panels) {
      if (this.fits.length < this.nodes) this.fits = grown(this.fits, this.values.length);
      for (; this.fitted < this.panels; this.fitted += 1) fitPanel(this.values, this.fitted * NODE_COUNT, this.fits);
    }
    return this.fits;
  }

  /** Appends a panel whose node values stand in `source` from `offset`. */
  append(start: number, width: number, source: Float64Array, offset: number): void {
    const { panels, nodes } = this;
    if (panels === this.starts.length) {
      const room = Math.max(FIRST_ROOM, ROOM_GROWTH * panels);
      this.starts = grown(this.starts, room);
      this.widths = grown(this.widths, room);
      this.values = grown(this.values, room * NODE_COUNT);
    }
    this.starts[panels] = start;
    this.widths[panels] = width;
    let size = this.size;
    for (let i = 0; i < NODE_COUNT; i += 1) {
      const value = source[offset + i];
      this.values[nodes + i] = value;
      // Not a plain comparison: a value that is not a number must not go unnoticed.
      if (!(Math.abs(value) <= size)) size = Math.abs(value);
    }
    this.size = size;
    this.panels = panels + 1;
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

  /** The values at ascending times, `size` times as large. */
  valuesAt(times: readonly number[], size = 1): number[] {
    const { starts, widths, panels, coefficients } = this;
    const drawn = new Array<number>(times.length);
    let panel = 0;
    for (let i = 0; i < times.length; i += 1) {
      while (panel + 1 < panels && starts[panel + 1] <= times[i]) panel += 1;
      const offset = panel * NODE_COUNT;
      const since = times[i] - starts[panel];
      drawn[i] = size * (since === 0 ? this.values[offset] : evaluatePanel(coefficients, offset, (2 * since) / widths[panel] - 1));
    }
    return drawn;
  }

  /** The polynomial of one panel, also at the panel's ends. */
  valueIn(panel: number, time: number): number {
    const offset = panel * NODE_COUNT;
    const since = time - this.starts[panel];
    return since === 0 ? this.values[offset] : evaluatePanel(this.coefficients, offset, (2 * since) / this.widths[panel] - 1);
  }
}

function grown(array: Float64Array, length: number): Float64Array {
  const longer = new Float64Array(length);
  longer.set(array);
  return longer;
}
