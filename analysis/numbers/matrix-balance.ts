import type { Matrix } from './matrix';

const RADIX = 2;
const MAX_SWEEPS = 20;
const WORTHWHILE = 0.95;

/**
 * Powers of two d for which diag(d)⁻¹·A·diag(d) has rows and columns of like size, so that an exponential of a stiff
 * matrix keeps its small entries. Rows or columns without off-diagonal entries are left alone.
 *
 * @see REFERENCES.md [Parlett & Reinsch 1969]
 */
export function balancingScales(a: Matrix): Float64Array {
  const scales = new Float64Array(a.rows).fill(1);
  for (let sweep = 0; sweep < MAX_SWEEPS; sweep += 1) {
    let changed = false;
    for (let i = 0; i < a.rows; i += 1) changed = balanceOne(a, scales, i) || changed;
    if (!changed) break;
  }
  return scales;
}

function balanceOne(a: Matrix, scales: Float64Array, i: number): boolean {
  let row = 0;
  let column = 0;
  for (let j = 0; j < a.rows; j += 1) {
    if (j === i) continue;
    row += Math.abs((a.data[i * a.columns + j] * scales[j]) / scales[i]);
    column += Math.abs((a.data[j * a.columns + i] * scales[i]) / scales[j]);
  }
  if (row === 0 || column === 0) return false;
  const factor = RADIX ** Math.round(Math.log2(row / column) / 2);
  if (column * factor + row / factor >= WORTHWHILE * (column + row)) return false;
  scales[i] *= factor;
  return true;
}
