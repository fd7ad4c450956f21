/** Places in the accumulator of a product that is built factor by factor. */
export const RE = 0;
export const IM = 1;
/** Whole turns that the argument of the product has made beyond atan2's (−π, π]. */
export const TURNS = 2;
/** d ln|product| / d ln ω. */
export const LOG_SLOPE = 3;
/** d arg(product) / d ln ω, radians. */
export const PHASE_SLOPE = 4;
export const WIDTH = 5;

export const startProduct = (product: Float64Array): void => {
  product[RE] = 1;
  product[IM] = product[TURNS] = product[LOG_SLOPE] = product[PHASE_SLOPE] = 0;
};

/**
 * Multiplies one complex factor into the product and keeps count of whole turns, so that the unwrapped argument costs one
 * atan2 at the very end instead of one per factor. Two arguments in [0, π] wrap where their product falls below the real
 * axis, two in (−π, 0) where it rises above.
 */
export const multiplyIn = (product: Float64Array, re: number, im: number): void => {
  const x = product[RE];
  const y = product[IM];
  const nextIm = x * im + y * re + 0;
  product[RE] = x * re - y * im;
  product[IM] = nextIm;
  const above = y >= 0;
  if (above !== im >= 0) return;
  const bothOnCut = y === 0 && im === 0 && x < 0 && re < 0;
  if (bothOnCut) product[TURNS] += 1;
  else if (above !== nextIm >= 0) product[TURNS] += above ? 1 : -1;
};

/** Divides the product by another one, neither of them zero, and takes its turns and slopes off. */
export const divideBy = (product: Float64Array, divisor: Float64Array): void => {
  const re = divisor[RE];
  const im = divisor[IM];
  const size = Math.abs(re) > Math.abs(im) ? Math.abs(re) : Math.abs(im);
  const x = re / size;
  const y = im / size;
  const share = 1 / (size * (x * x + y * y));
  multiplyIn(product, x * share, 0 - y * share);
  // The divisor's argument is π on the cut, and so is that of its inverse: one turn too many.
  if (im === 0 && re < 0) product[TURNS] -= 1;
  product[TURNS] -= divisor[TURNS];
  product[LOG_SLOPE] -= divisor[LOG_SLOPE];
  product[PHASE_SLOPE] -= divisor[PHASE_SLOPE];
};

/** Unwrapped argument of the product, radians. */
export const argument = (product: Float64Array): number => Math.atan2(product[IM], product[RE]) + 2 * Math.PI * product[TURNS];
