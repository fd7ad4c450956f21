import type { Matrix } from '@/analysis/numbers/matrix';

export const dot = (a: Float64Array, b: Float64Array): number => {
  let sum = 0;
  for (let i = 0; i < a.length; i += 1) sum += a[i] * b[i];
  return sum;
};

/** The row that reads from a state what `row` reads from it after a change (state ← state + change·state). */
export const rowAfter = (row: Float64Array, { rows, data }: Matrix): Float64Array => {
  const later = Float64Array.from(row);
  for (let i = 0; i < rows; i += 1) for (let j = 0; j < rows; j += 1) later[j] += row[i] * data[i * rows + j];
  return later;
};
