import { chained, ExponentialChanges } from '@/analysis/numbers/matrix-exponential';
import { columnNorm, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
import type { LoopSystem } from './loop-system';
import { NODES, NODE_COUNT, TAYLOR } from './nodes';
import type { WorkBudget } from './work-budget';

/** Signals at the nodes of one panel, one after the other; the measurement only where it comes round through a dead time. */
export const WATCHED = ['output', 'control', 'measurement'] as const;

/**
 * The exact linear map over one panel of time: from the state at its start and the delayed measurement at its nodes to
 * the watched signals at its nodes and the state at its end (the last rows).
 */
export interface PanelOperator {
  readonly width: number;
  readonly matrix: Matrix;
}

/** Nodes stand symmetrically, so that only half of the gaps between them differ. */
const GAPS = Array.from(NODES.subarray(1, (NODE_COUNT + 1) / 2), (node, i) => node - NODES[i]);
const gapBefore = (node: number): number => Math.min(node, NODE_COUNT - node) - 1;

/** Matrix products that one panel's exponentials cost, their squarings by and large. */
const PRODUCTS_PER_PANEL = 60;

/**
 * Makes the operators of one loop.
 *
 * Solves ẋ = A·x + b·m(t) exactly for a polynomial m: its Taylor coefficients w become states with ẇₖ = (k + 1)·wₖ₊₁, so
 * that one exponential holds e^(A·t) and every φ-function at once. Watched rows go from node to node by the exponential over
 * the gap between them, and the state by the product of them all.
 *
 * @see REFERENCES.md [Van Loan 1978], [Hochbruck & Ostermann 2010] section 2.1
 */
export class PanelOperators {
  /** [[A, b], [0, 0]], b brought to the size of A, so that a high gain costs the exponential no digits. */
  private readonly generator: Matrix;
  private readonly driveSize: number;
  private readonly isDelayed: boolean;
  private readonly exponentials: ExponentialChanges;
  /** The width whose exponentials stand there; 0 for none. */
  private width = 0;

  constructor(
    private readonly system: LoopSystem,
    private readonly budget: WorkBudget,
  ) {
    const { dynamics, drive, deadTime } = system;
    const size = dynamics.rows;
    this.isDelayed = deadTime > 0;
    this.driveSize = drive.reduce((sum, x) => sum + Math.abs(x), 0) / (columnNorm(dynamics) || 1) || 1;
    const order = size + (this.isDelayed ? NODE_COUNT : 0);
    this.generator = zeroMatrix(order, order);
    this.exponentials = new ExponentialChanges(order, GAPS);
  }

  /** @throws OutOfWork */
  ofWidth(width: number): PanelOperator {
    this.budget.spend(PRODUCTS_PER_PANEL * this.generator.rows ** 3);
    const rows = this.rowsOver(this.exponentialsOver(width));
    return { width, matrix: this.isDelayed ? this.overNodeValues(rows) : rows };
  }

  /** e^(gap·A·h) − I for every gap: squares of the last ones where the width is that width doubled so often. */
  private exponentialsOver(width: number): readonly Matrix[] {
    const doublings = this.isDelayed ? NaN : Math.log2(width / this.width);
    this.width = width;
    if (Number.isInteger(doublings) && doublings >= 0) return this.exponentials.doubled(doublings);
    this.setGenerator(width);
    return this.exponentials.of(this.generator);
  }

  /** [[A·h, b·h], [0, N]], N the shift of Taylor coefficients. */
  private setGenerator(width: number): void {
    const { generator, driveSize, isDelayed } = this;
    const { dynamics, drive } = this.system;
    const size = dynamics.rows;
    for (let i = 0; i < size; i += 1) {
      const row = i * generator.columns;
      for (let j = 0; j < size; j += 1) generator.data[row + j] = dynamics.data[i * size + j] * width;
      if (isDelayed) generator.data[row + size] = (drive[i] / driveSize) * width;
    }
    for (let k = 1; size + k < generator.rows; k += 1) generator.data[(size + k - 1) * generator.columns + size + k] = k;
  }

  /** The operator's rows over states and Taylor coefficients. */
  private rowsOver(gaps: readonly Matrix[]): Matrix {
    const { system, isDelayed } = this;
    const size = system.dynamics.rows;
    const signals = isDelayed ? WATCHED : WATCHED.slice(0, 2);
    const rows = zeroMatrix(signals.length * NODE_COUNT + size, this.generator.rows);
    signals.forEach((signal, s) => {
      rows.data.set(system.rows[signal], s * NODE_COUNT * rows.columns);
      for (let node = 1; node < NODE_COUNT; node += 1) carry(rows, s * NODE_COUNT + node, gaps[gapBefore(node)]);
    });
    const half = gaps.reduce(chained);
    const whole = chained(half, half);
    const first = rows.rows - size;
    rows.data.set(whole.data.subarray(0, size * whole.columns), first * rows.columns);
    for (let i = 0; i < size; i += 1) rows.data[(first + i) * rows.columns + i] += 1;
    return rows;
  }

  /** Rows over Taylor coefficients as rows over node values of the delayed measurement, which some signals also are fed directly. */
  private overNodeValues(rows: Matrix): Matrix {
    const { dynamics, feedthrough } = this.system;
    const size = dynamics.rows;
    const matrix = zeroMatrix(rows.rows, size + NODE_COUNT);
    for (let i = 0; i < rows.rows; i += 1) {
      const [from, to] = [i * rows.columns, i * matrix.columns];
      matrix.data.set(rows.data.subarray(from, from + size), to);
      for (let k = 0; k < NODE_COUNT; k += 1) {
        const factor = rows.data[from + size + k] * this.driveSize;
        for (let j = 0; j < NODE_COUNT; j += 1) matrix.data[to + size + j] += factor * TAYLOR.data[k * NODE_COUNT + j];
      }
    }
    WATCHED.forEach((signal, s) => {
      for (let node = 0; node < NODE_COUNT; node += 1)
        matrix.data[(s * NODE_COUNT + node) * matrix.columns + size + node] += feedthrough[signal];
    });
    return matrix;
  }
}

/** Fills a row with the one before it times I + change. */
function carry(rows: Matrix, target: number, change: Matrix): void {
  const { data, columns } = rows;
  const [from, to] = [(target - 1) * columns, target * columns];
  for (let j = 0; j < columns; j += 1) data[to + j] = data[from + j];
  for (let i = 0; i < columns; i += 1) {
    const factor = data[from + i];
    if (factor === 0) continue;
    for (let j = 0; j < columns; j += 1) data[to + j] += factor * change.data[i * columns + j];
  }
}
