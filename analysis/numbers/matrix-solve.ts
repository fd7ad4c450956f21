import { zeroMatrix, type Matrix } from './matrix';

/**
 * X with A·X = B, by Gaussian elimination with row pivoting.
 *
 * @throws RangeError where A is singular to working precision: callers solve systems that are regular by construction.
 */
export function solve(a: Matrix, b: Matrix): Matrix {
  const order = a.rows;
  const left = Float64Array.from(a.data);
  const solution = { ...zeroMatrix(b.rows, b.columns), data: Float64Array.from(b.data) };
  for (let pivot = 0; pivot < order; pivot += 1) {
    const row = pivotRow(left, order, pivot);
    if (left[row * order + pivot] === 0) throw new RangeError('The matrix is singular.');
    swapRows(left, order, [row, pivot]);
    swapRows(solution.data, b.columns, [row, pivot]);
    for (let i = pivot + 1; i < order; i += 1) {
      const factor = left[i * order + pivot] / left[pivot * order + pivot];
      if (factor === 0) continue;
      subtractRow(left, order, [i, pivot], factor);
      subtractRow(solution.data, b.columns, [i, pivot], factor);
    }
  }
  for (let pivot = order - 1; pivot >= 0; pivot -= 1) {
    for (let j = 0; j < b.columns; j += 1) solution.data[pivot * b.columns + j] /= left[pivot * order + pivot];
    for (let i = 0; i < pivot; i += 1) subtractRow(solution.data, b.columns, [i, pivot], left[i * order + pivot]);
  }
  return solution;
}

function pivotRow(data: Float64Array, order: number, column: number): number {
  let best = column;
  for (let i = column + 1; i < order; i += 1) {
    if (Math.abs(data[i * order + column]) > Math.abs(data[best * order + column])) best = i;
  }
  return best;
}

function swapRows(data: Float64Array, columns: number, [a, b]: readonly [number, number]): void {
  if (a === b) return;
  const kept = data.slice(a * columns, (a + 1) * columns);
  data.copyWithin(a * columns, b * columns, (b + 1) * columns);
  data.set(kept, b * columns);
}

function subtractRow(data: Float64Array, columns: number, [target, source]: readonly [number, number], factor: number): void {
  if (factor === 0) return;
  for (let j = 0; j < columns; j += 1) data[target * columns + j] -= factor * data[source * columns + j];
}
