import { exponential } from '@/analysis/numbers/matrix-exponential';
import { columnNorm, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
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

/** Matrix products that one exponential costs, its squarings by and large. */
const PRODUCTS_PER_EXPONENTIAL = 20;

/**
 * Solves ẋ = A·x + b·m(t) exactly for a polynomial m: its Taylor coefficients w become states with ẇₖ = (k + 1)·wₖ₊₁,
 * so that one exponential per node holds e^(A·t) and every φ-function at once.
 *
 * @see REFERENCES.md [Van Loan 1978], [Hochbruck & Ostermann 2010] section 2.1
 */
export function panelOperator(system: LoopSystem, width: number, budget: WorkBudget): PanelOperator {
  const size = system.dynamics.rows;
  const delayed = system.deadTime > 0;
  budget.spend(NODE_COUNT * PRODUCTS_PER_EXPONENTIAL * (size + (delayed ? NODE_COUNT : 0)) ** 3);
  const matrix = zeroMatrix(WATCHED.length * NODE_COUNT + size, size + (delayed ? NODE_COUNT : 0));
  const flowAt = delayed ? drivenFlow(system, width) : (share: number) => exponential(scaled(system.dynamics, width * share));
  for (let node = 0; node < NODE_COUNT; node += 1) {
    const flow = flowAt(NODES[node]);
    WATCHED.forEach((signal, s) => {
      const target = (s * NODE_COUNT + node) * matrix.columns;
      const row = system.rows[signal];
      for (let i = 0; i < size; i += 1) {
        if (row[i] === 0) continue;
        for (let j = 0; j < matrix.columns; j += 1) matrix.data[target + j] += row[i] * flow.data[i * flow.columns + j];
      }
      if (delayed) matrix.data[target + size + node] += system.feedthrough[signal];
    });
    if (node === NODE_COUNT - 1) matrix.data.set(flow.data.subarray(0, size * flow.columns), WATCHED.length * NODE_COUNT * matrix.columns);
  }
  return { width, matrix };
}

const scaled = (matrix: Matrix, factor: number): Matrix => ({ ...matrix, data: matrix.data.map((value) => value * factor) });

/**
 * The flow of [[A·h, b·h], [0, N]] over a share of the panel, N the shift of Taylor coefficients, as a map from state and
 * node values to state. b is brought to the size of A first, so that a high gain costs the exponential no digits.
 */
function drivenFlow({ dynamics, drive }: LoopSystem, width: number): (share: number) => Matrix {
  const size = dynamics.rows;
  const driveSize = drive.reduce((sum, x) => sum + Math.abs(x), 0) / (columnNorm(dynamics) || 1) || 1;
  const generator = zeroMatrix(size + NODE_COUNT, size + NODE_COUNT);
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j < size; j += 1) generator.data[i * generator.columns + j] = dynamics.data[i * size + j] * width;
    generator.data[i * generator.columns + size] = (drive[i] / driveSize) * width;
  }
  for (let k = 1; k < NODE_COUNT; k += 1) generator.data[(size + k - 1) * generator.columns + size + k] = k;
  return (share) => ontoNodes(exponential(scaled(generator, share)), size, driveSize);
}

/** The state rows of a driven flow, its Taylor columns exchanged for columns of node values. */
function ontoNodes(flow: Matrix, size: number, driveSize: number): Matrix {
  const mapped = zeroMatrix(size, size + NODE_COUNT);
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j < size; j += 1) mapped.data[i * mapped.columns + j] = flow.data[i * flow.columns + j];
    for (let k = 0; k < NODE_COUNT; k += 1) {
      const factor = flow.data[i * flow.columns + size + k] * driveSize;
      for (let j = 0; j < NODE_COUNT; j += 1) mapped.data[i * mapped.columns + size + j] += factor * TAYLOR.data[k * NODE_COUNT + j];
    }
  }
  return mapped;
}
