/** A delay as whole sample periods and a rest, a share of one period in [0, 1). */
export interface SplitDelay {
  readonly periods: number;
  readonly rest: number;
}

/** Nearer to a whole number of periods than this, relatively, a delay is one: 0.3 is three times 0.1. */
const WHOLE = 1e-12;

/** @example splitDelay(0.25, 0.1) // { periods: 2, rest: 0.5 } */
export const splitDelay = (delay: number, period: number): SplitDelay => {
  const count = delay / period;
  const nearest = Math.round(count);
  if (Math.abs(count - nearest) <= WHOLE * Math.max(count, 1)) return { periods: nearest, rest: 0 };
  return { periods: Math.floor(count), rest: count - Math.floor(count) };
};
