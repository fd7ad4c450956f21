import { columnNorm, multiply, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
import { HELD_INPUTS } from './loop-system';
import { NODE_COUNT } from './nodes';
import { WATCHED, type PanelOperator } from './panel-operator';

/** The map is squared until it shrinks or has grown beyond doubt; a stable loop's slowest mode shrinks within these. */
const MAX_SQUARINGS = 40;
const GROWN_NORM = 1e30;

/**
 * Whether panels of this width, one after the other, keep rounding errors bounded as the stable loop itself does: a panel
 * too wide for a motion that has died out would wake it again. A power of the map of state and measurement whose norm is
 * below 1 proves that its eigenvalues are.
 */
export function isStablePanel(operator: PanelOperator): boolean {
  let power = turnMap(operator);
  for (let k = 0; k < MAX_SQUARINGS; k += 1) {
    const norm = columnNorm(power);
    if (norm < 1) return true;
    if (!(norm < GROWN_NORM)) return false;
    power = multiply(power, power);
  }
  return false;
}

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
