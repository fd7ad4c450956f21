import { columnNorm, multiply, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
import { HELD_INPUTS } from './loop-system';
import { NODE_COUNT } from './nodes';
import { WATCHED, type PanelOperator } from './panel-operator';

/** The map is raised to 2⁵ to forget how its states are scaled, and on to 2¹¹ to see whether it grows. */
const FIRST_SQUARINGS = 5;
const LATER_SQUARINGS = 6;
const BOUNDED = 10;

/**
 * Whether panels of this width, one after the other, keep rounding errors bounded as the stable loop itself does: a panel
 * too wide for a motion that has died out would wake it again. Decided on the powers of the map of state and measurement.
 */
export function isStablePanel(operator: PanelOperator): boolean {
  const early = repeated(turnMap(operator), FIRST_SQUARINGS);
  return columnNorm(repeated(early, LATER_SQUARINGS)) <= BOUNDED * columnNorm(early);
}

const repeated = (map: Matrix, squarings: number): Matrix => (squarings === 0 ? map : repeated(multiply(map, map), squarings - 1));

/** (state, measurement on the panel before) → (state, measurement on this one), the held inputs left out. */
function turnMap({ matrix }: PanelOperator): Matrix {
  const states = matrix.columns - NODE_COUNT - HELD_INPUTS;
  const order = states + NODE_COUNT;
  const map = zeroMatrix(order, order);
  const firstMeasurement = WATCHED.indexOf('measurement') * NODE_COUNT;
  for (let i = 0; i < order; i += 1) {
    const row = (i < states ? WATCHED.length * NODE_COUNT + i : firstMeasurement + i - states) * matrix.columns;
    for (let j = 0; j < order; j += 1) map.data[i * order + j] = matrix.data[row + (j < states ? j : j + HELD_INPUTS)];
  }
  return map;
}
