import { identityMatrix, multiply, weightedSum, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
import { solve } from '@/analysis/numbers/matrix-solve';
import { interpolationWeights, NODES, NODE_COUNT } from './nodes';
import { WATCHED, type PanelOperator } from './panel-operator';

/**
 * The map over a panel longer than the dead time, from the state at its start and the measurement on the panel before.
 *
 * There the delayed measurement s comes partly from the panel before and partly from this very panel: s = P·q₀ + C·q.
 * With q = O·x + G·s, the measurement rows of `base`, this is solved once and for all:
 * q = (I − G·C)⁻¹·(O·x + G·P·q₀). A collocation of the order of the nodes, which is what makes a dead time of
 * milliseconds in a response of hours cheap.
 *
 * @param base the operator of a panel of this width for a known delayed measurement
 * @see REFERENCES.md [Bellen & Zennaro 2003], chapter 5
 */
export function longPanelOperator({ width, matrix }: PanelOperator, deadTime: number): PanelOperator {
  const size = matrix.columns - NODE_COUNT;
  const fromState = block(matrix, [0, matrix.rows], [0, size]);
  const fromDelayed = block(matrix, [0, matrix.rows], [size, matrix.columns]);
  const firstRow = WATCHED.indexOf('measurement') * NODE_COUNT;
  const measured = [firstRow, firstRow + NODE_COUNT] as const;
  const stateToMeasured = block(matrix, measured, [0, size]);
  const delayedToMeasured = block(matrix, measured, [size, matrix.columns]);
  const { before, within } = delayedNodes(deadTime / width);

  const implicit = weightedSum([
    [1, identityMatrix(NODE_COUNT)],
    [-1, multiply(delayedToMeasured, within)],
  ]);
  const state = multiply(within, solve(implicit, stateToMeasured));
  const history = weightedSum([
    [1, before],
    [1, multiply(within, solve(implicit, multiply(delayedToMeasured, before)))],
  ]);
  return {
    width,
    matrix: beside(
      weightedSum([
        [1, fromState],
        [1, multiply(fromDelayed, state)],
      ]),
      multiply(fromDelayed, history),
    ),
  };
}

/** The delayed signal at the nodes from the nodes of the panel before and of this one; `share` is dead time per width, below 1. */
function delayedNodes(share: number): { before: Matrix; within: Matrix } {
  const before = zeroMatrix(NODE_COUNT, NODE_COUNT);
  const within = zeroMatrix(NODE_COUNT, NODE_COUNT);
  NODES.forEach((node, i) => {
    const target = node < share ? before : within;
    const position = node < share ? 1 + node - share : node - share;
    target.data.set(interpolationWeights(position), i * NODE_COUNT);
  });
  return { before, within };
}

type Range = readonly [from: number, to: number];

function block(matrix: Matrix, [top, bottom]: Range, [left, right]: Range): Matrix {
  const part = zeroMatrix(bottom - top, right - left);
  for (let i = top; i < bottom; i += 1) {
    part.data.set(matrix.data.subarray(i * matrix.columns + left, i * matrix.columns + right), (i - top) * part.columns);
  }
  return part;
}

function beside(left: Matrix, right: Matrix): Matrix {
  const whole = zeroMatrix(left.rows, left.columns + right.columns);
  for (let i = 0; i < whole.rows; i += 1) {
    whole.data.set(left.data.subarray(i * left.columns, (i + 1) * left.columns), i * whole.columns);
    whole.data.set(right.data.subarray(i * right.columns, (i + 1) * right.columns), i * whole.columns + left.columns);
  }
  return whole;
}
