import { balancingScales } from '@/analysis/numbers/matrix-balance';
import { columnNorm, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
import { combine, type Signal } from './assembly';

/** What a simulation watches, as rows over [states, reference, load]. */
export interface Watched<Row> {
  readonly output: Row;
  readonly control: Row;
  readonly measurement: Row;
}

/**
 * ẋ = dynamics·x + drive·m(t − deadTime), with x the states and, as two more states that stand still, reference and load;
 * m is the measurement, and each watched signal is row·x + feedthrough·m(t − deadTime).
 * Without dead time the loop is closed inside `dynamics` and the drive is zero.
 */
export interface LoopSystem {
  readonly dynamics: Matrix;
  readonly drive: Float64Array;
  readonly rows: Watched<Float64Array>;
  readonly feedthrough: Watched<number>;
  readonly deadTime: number;
  /** x just after a reference step and a load step of these sizes, from rest. */
  initial(reference: number, load: number): Float64Array;
}

/** Reference and load. */
export const HELD_INPUTS = 2;

/** Closes the loop where there is no dead time and balances the states. Null where 1 + L(∞) = 0 without dead time. */
export function assembleSystem(open: Watched<Signal> & { derivatives: readonly Signal[] }, deadTime: number): LoopSystem | null {
  const measured = open.output.length - 1;
  const loopClosure = 1 - open.measurement[measured];
  if (deadTime === 0 && loopClosure === 0) return null;
  const close = (row: Signal): Signal => {
    if (deadTime > 0) return row;
    const closed = combine([1, row], [row[measured] / loopClosure, open.measurement]);
    closed[measured] = 0;
    return closed;
  };
  return balanced(open.derivatives.map(close), {
    rows: { output: close(open.output), control: close(open.control), measurement: close(open.measurement) },
    deadTime,
  });
}

function balanced(derivatives: readonly Signal[], { rows, deadTime }: { rows: Watched<Signal>; deadTime: number }): LoopSystem {
  const order = derivatives.length;
  const size = order + HELD_INPUTS;
  const full = zeroMatrix(size, size);
  derivatives.forEach((row, i) => full.data.set(row.subarray(0, size), i * size));
  const states = zeroMatrix(order, order);
  derivatives.forEach((row, i) => states.data.set(row.subarray(0, order), i * order));

  const scales = new Float64Array(size).fill(1);
  scales.set(balancingScales(states));
  const norm = columnNorm(states) || 1;
  for (let column = order; column < size; column += 1) scales[column] = inputScale(full, scales, { column, norm });

  const dynamics = { ...full, data: full.data.map((value, k) => (value * scales[k % size]) / scales[Math.floor(k / size)]) };
  const scaledRow = (row: Signal) => row.subarray(0, size).map((value, j) => value * scales[j]);
  return {
    dynamics,
    drive: Float64Array.from({ length: size }, (_, i) => (i < order ? derivatives[i][size] / scales[i] : 0)),
    rows: { output: scaledRow(rows.output), control: scaledRow(rows.control), measurement: scaledRow(rows.measurement) },
    feedthrough: { output: rows.output[size], control: rows.control[size], measurement: rows.measurement[size] },
    deadTime,
    initial(reference, load) {
      const x = new Float64Array(size);
      x[order] = reference / scales[order];
      x[order + 1] = load / scales[order + 1];
      return x;
    },
  };
}

/** The power of two that makes an input's column as large as the matrix it stands beside. */
function inputScale(full: Matrix, scales: Float64Array, { column, norm }: { column: number; norm: number }): number {
  let sum = 0;
  for (let i = 0; i < full.rows; i += 1) sum += Math.abs(full.data[i * full.columns + column] / scales[i]);
  return sum === 0 ? 1 : 2 ** Math.round(Math.log2(norm / sum));
}
