import type { Rational } from '@/analysis/loop/model';
import { columnNorm, zeroMatrix, type Matrix } from '@/analysis/numbers/matrix';
import { balancingScales } from '@/analysis/numbers/matrix-balance';
import { Assembly, type Signal } from '@/analysis/time/assembly';

/**
 * ẋ = A·x + B·u of a chain of functions, balanced, with the held input as one more state that stands still:
 * `dynamics` is [[A, B], [0, 0]], and rows are over [x, u]. The input state holds u/inputScale.
 */
export interface StateEquations {
  readonly dynamics: Matrix;
  /** Of the last function of the chain. */
  readonly output: Float64Array;
  /** Of each function of the chain. */
  readonly outputs: readonly Float64Array[];
  readonly inputScale: number;
}

/** State equations of functions one behind the other. */
export const stateEquations = (chain: readonly Rational[]): StateEquations => {
  const order = chain.reduce((sum, { poles }) => sum + poles.length, 0);
  const assembly = new Assembly(order, 1);
  const rows: Signal[] = [];
  chain.reduce((signal, part) => {
    const next = assembly.feed(part, signal);
    rows.push(next);
    return next;
  }, assembly.input(0));
  const size = order + 1;
  const states = zeroMatrix(order, order);
  assembly.derivatives.forEach((row, i) => states.data.set(row.subarray(0, order), i * order));
  const scales = new Float64Array(size).fill(1);
  scales.set(balancingScales(states));
  const drive = assembly.derivatives.reduce((sum, row, i) => sum + Math.abs(row[order]) / scales[i], 0);
  scales[order] = drive === 0 ? 1 : 2 ** Math.round(Math.log2((columnNorm(states) || 1) / drive));
  const dynamics = zeroMatrix(size, size);
  assembly.derivatives.forEach((row, i) => row.forEach((value, j) => (dynamics.data[i * size + j] = (value * scales[j]) / scales[i])));
  const outputs = rows.map((row) => row.map((value, j) => value * scales[j]));
  return { dynamics, output: outputs[outputs.length - 1], outputs, inputScale: scales[order] };
};
