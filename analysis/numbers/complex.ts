/** A complex number as plain data. Hot loops work on separate re and im values instead and allocate nothing. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

/** Squares below this lose digits. */
const LEAST_SQUARE = 1e-280;

/** |re + j·im|: by Math.hypot, which is slow, only where squares overflow or vanish. */
export const magnitude = (re: number, im: number): number => {
  const square = re * re + im * im;
  return square > LEAST_SQUARE && square < Infinity ? Math.sqrt(square) : Math.hypot(re, im);
};
