/** A small dense real matrix, row by row. Orders here are tens, so plain triple loops are the fastest there is. */
export interface Matrix {
  readonly rows: number;
  readonly columns: number;
  readonly data: Float64Array;
}

export function zeroMatrix(rows: number, columns: number): Matrix {
  return { rows, columns, data: new Float64Array(rows * columns) };
}

export function identityMatrix(order: number): Matrix {
  const identity = zeroMatrix(order, order);
  for (let i = 0; i < order; i += 1) identity.data[i * order + i] = 1;
  return identity;
}

/** A matrix from rows of equal length. */
export function matrixOf(rows: readonly ArrayLike<number>[]): Matrix {
  const matrix = zeroMatrix(rows.length, rows[0]?.length ?? 0);
  rows.forEach((row, i) => matrix.data.set(row, i * matrix.columns));
  return matrix;
}

export function scaledBy(matrix: Matrix, factor: number): Matrix {
  const scaled = zeroMatrix(matrix.rows, matrix.columns);
  for (let i = 0; i < scaled.data.length; i += 1) scaled.data[i] = factor * matrix.data[i];
  return scaled;
}

export function multiply(a: Matrix, b: Matrix): Matrix {
  const product = zeroMatrix(a.rows, b.columns);
  addProduct(a, b, product);
  return product;
}

/** Adds a·b to `sum`, which is neither of them. */
export function addProduct(a: Matrix, b: Matrix, sum: Matrix): void {
  const [left, right, data] = [a.data, b.data, sum.data];
  const { columns } = b;
  for (let i = 0; i < a.rows; i += 1) {
    for (let k = 0; k < a.columns; k += 1) {
      const factor = left[i * a.columns + k];
      if (factor === 0) continue;
      for (let j = 0; j < columns; j += 1) data[i * columns + j] += factor * right[k * columns + j];
    }
  }
}

/** Σ weightᵢ·matrixᵢ, all of one shape. */
export function weightedSum(terms: readonly (readonly [weight: number, matrix: Matrix])[]): Matrix {
  const [, first] = terms[0];
  const sum = zeroMatrix(first.rows, first.columns);
  for (const [weight, matrix] of terms) for (let i = 0; i < sum.data.length; i += 1) sum.data[i] += weight * matrix.data[i];
  return sum;
}

/** The greatest absolute column sum. */
export function columnNorm(matrix: Matrix): number {
  let norm = 0;
  for (let j = 0; j < matrix.columns; j += 1) {
    let sum = 0;
    for (let i = 0; i < matrix.rows; i += 1) sum += Math.abs(matrix.data[i * matrix.columns + j]);
    norm = Math.max(norm, sum);
  }
  return norm;
}
