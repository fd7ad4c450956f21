import { magnitude } from './complex';
/** Places in what `hornerWithSlope` writes. */
export const VALUE_RE = 0;
export const VALUE_IM = 1;
export const SLOPE_RE = 2;
export const SLOPE_IM = 3;
/** Σ|cₖ|·|z|ᵏ: what roundings of the value are measured against. */
export const SIZE = 4;

/** Room for one evaluation. */
export const hornerRoom = (): Float64Array => new Float64Array(5);

/** A real polynomial with its derivative and the sum of its terms' magnitudes at re + j·im. Leading coefficient first. */
export const hornerWithSlope = (descending: ArrayLike<number>, re: number, im: number, room: Float64Array): void => {
  const size = magnitude(re, im);
  let [valueRe, valueIm, slopeRe, slopeIm, sum] = [0, 0, 0, 0, 0];
  for (let k = 0; k < descending.length; k += 1) {
    const c = descending[k];
    const nextSlopeRe = slopeRe * re - slopeIm * im + valueRe;
    slopeIm = slopeRe * im + slopeIm * re + valueIm;
    slopeRe = nextSlopeRe;
    const nextValueRe = valueRe * re - valueIm * im + c;
    valueIm = valueRe * im + valueIm * re;
    valueRe = nextValueRe;
    sum = sum * size + Math.abs(c);
  }
  room[VALUE_RE] = valueRe;
  room[VALUE_IM] = valueIm;
  room[SLOPE_RE] = slopeRe;
  room[SLOPE_IM] = slopeIm;
  room[SIZE] = sum;
};
