import { chained, exponentialChanges } from '@/analysis/numbers/matrix-exponential';
import { columnNorm, scaledBy, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
import type { LoopSystem } from './loop-system';
import { NODES, NODE_COUNT, TAYLOR } from './nodes';
import type { WorkBudget } from './work-budget';

/** Signals at the nodes of one panel, one after the other. */
export const WATCHED = ['output', 'control', 'measurement'] as const;

/**
 * The exact linear map over one panel of time: from the state at its start and the delayed measurement at its nodes to
 * the watched signals at its nodes (rows WATCHED × NODE_COUNT) and the state at its end (the last rows).
 */
export interface PanelOperator {
  readonly width: number;
  readonly matrix: Matrix;
}

/** Nodes stand symmetrically, so that only half of the gaps between them differ. */
const GAPS = NODES.slice(1, (NODE_COUNT + 1) / 2).map((node, i) => node - NODES[i]);
const gapBefore = (node: number): number => Math.min(node, NODE_COUNT - node) - 1;

/** Matrix products that one panel's exponentials cost, their squarings by and large. */
const PRODUCTS_PER_PANEL = 60;

/**
 * Solves ẋ = A·x + b·m(t) exactly for a polynomial m: its Taylor coefficients w become states with ẇₖ = (k + 1)·wₖ₊₁, so
 * that one exponential holds e^(A·t) and every φ-function at once. Watched rows go from node to node by the exponential over
 * the gap between them, and the state by the product of them all.
 *
 * @throws OutOfWork
 * @see REFERENCES.md [Van Loan 1978], [Hochbruck & Ostermann 2010] section 2.1
 */
export function panelOperator(system: LoopSystem, width: number, budget: WorkBudget): PanelOperator {
  const size = system.dynamics.rows;
  const delayed = system.deadTime > 0;
  const { generator, driveSize } = delayed ? drivenGenerator(system, width) : { generator: scaledBy(system.dynamics, width), driveSize: 0 };
  budget.spend(PRODUCTS_PER_PANEL * generator.rows ** 3);
  const gaps = exponentialChanges(generator, Array.from(GAPS));
  const matrix = zeroMatrix(WATCHED.length * NODE_COUNT + size, size + (delayed ? NODE_COUNT : 0));
  const place = (target: number, row: Float64Array) => setRow(matrix, target, { row, size, driveSize });
  WATCHED.forEach((signal, s) => {
    let row: Float64Array = new Float64Array(generator.rows);
    row.set(system.rows[signal]);
    for (let node = 0; node < NODE_COUNT; node += 1) {
      if (node > 0) row = carried(row, gaps[gapBefore(node)]);
      const target = s * NODE_COUNT + node;
      place(target, row);
      if (delayed) matrix.data[target * matrix.columns + size + node] += system.feedthrough[signal];
    }
  });
  const half = gaps.reduce(chained);
  const whole = chained(half, half);
  for (let i = 0; i < size; i += 1) {
    const row = whole.data.slice(i * whole.columns, (i + 1) * whole.columns);
    row[i] += 1;
    place(WATCHED.length * NODE_COUNT + i, row);
  }
  return { width, matrix };
}

/** row·(I + change). */
function carried(row: Float64Array, change: Matrix): Float64Array {
  const next = Float64Array.from(row);
  for (let i = 0; i < row.length; i += 1) {
    if (row[i] === 0) continue;
    for (let j = 0; j < row.length; j += 1) next[j] += row[i] * change.data[i * change.columns + j];
  }
  return next;
}

/** Writes a row over states and Taylor coefficients as one over states and node values. */
function setRow(matrix: Matrix, target: number, { row, size, driveSize }: { row: Float64Array; size: number; driveSize: number }): void {
  const offset = target * matrix.columns;
  matrix.data.set(row.subarray(0, size), offset);
  for (let k = 0; size + k < row.length; k += 1) {
    const factor = row[size + k] * driveSize;
    for (let j = 0; j < NODE_COUNT; j += 1) matrix.data[offset + size + j] += factor * TAYLOR.data[k * NODE_COUNT + j];
  }
}

/**
 * [[A·h, b·h], [0, N]], N the shift of Taylor coefficients. b is brought to the size of A first, so that a high gain costs the
 * exponential no digits.
 */
function drivenGenerator({ dynamics, drive }: LoopSystem, width: number): { generator: Matrix; driveSize: number } {
  const size = dynamics.rows;
  const driveSize = drive.reduce((sum, x) => sum + Math.abs(x), 0) / (columnNorm(dynamics) || 1) || 1;
  const generator = zeroMatrix(size + NODE_COUNT, size + NODE_COUNT);
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j < size; j += 1) generator.data[i * generator.columns + j] = dynamics.data[i * size + j] * width;
    generator.data[i * generator.columns + size] = (drive[i] / driveSize) * width;
  }
  for (let k = 1; k < NODE_COUNT; k += 1) generator.data[(size + k - 1) * generator.columns + size + k] = k;
  return { generator, driveSize };
}
