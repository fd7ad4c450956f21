import { zeroMatrix, type Matrix } from './matrix';

/**
 * X with A·X = B, by Gaussian elimination with row pivoting.
 *
 * @throws RangeError where A is singular to working precision: callers solve systems that are regular by construction.
 */
export function solve(a: Matrix, b: Matrix): Matrix {
  const left = { ...a, data: Float64Array.from(a.data) };
  const solution = { ...zeroMatrix(b.rows, b.columns), data: Float64Array.from(b.data) };
  solveInPlace(left, solution);
  return solution;
}

/** The same without a copy: X takes the place of B, and A is lost. @throws RangeError as `solve` does */
export function solveInPlace(a: Matrix, b: Matrix): void {
  const order = a.rows;
  const left = a.data;
  for (let pivot = 0; pivot < order; pivot += 1) {
    const row = pivotRow(left, order, pivot);
    if (left[row * order + pivot] === 0) throw new RangeError('The matrix is singular.');
    if (row !== pivot) {
      swapRows(left, order, row, pivot);
      swapRows(b.data, b.columns, row, pivot);
    }
    for (let i = pivot + 1; i < order; i += 1) {
      const factor = left[i * order + pivot] / left[pivot * order + pivot];
      if (factor === 0) continue;
      for (let j = pivot + 1; j < order; j += 1) left[i * order + j] -= factor * left[pivot * order + j];
      subtractRow(b, i, pivot, factor);
    }
  }
  for (let pivot = order - 1; pivot >= 0; pivot -= 1) {
    const inverse = 1 / left[pivot * order + pivot];
    for (let j = 0; j < b.columns; j += 1) b.data[pivot * b.columns + j] *= inverse;
    for (let i = 0; i < pivot; i += 1) subtractRow(b, i, pivot, left[i * order + pivot]);
  }
}

function pivotRow(data: Float64Array, order: number, column: number): number {
  let best = column;
  for (let i = column + 1; i < order; i += 1) {
    if (Math.abs(data[i * order + column]) > Math.abs(data[best * order + column])) best = i;
  }
  return best;
}

function swapRows(data: Float64Array, columns: number, a: number, b: number): void {
  for (let j = 0; j < columns; j += 1) {
    const kept = data[a * columns + j];
    data[a * columns + j] = data[b * columns + j];
    data[b * columns + j] = kept;
  }
}

function subtractRow({ data, columns }: Matrix, target: number, source: number, factor: number): void {
  if (factor === 0) return;
  for (let j = 0; j < columns; j += 1) data[target * columns + j] -= factor * data[source * columns + j];
}
