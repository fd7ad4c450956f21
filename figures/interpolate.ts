import { bisectRight } from 'd3-array';

/** The value of a series at `at`, linear between its points; null outside them. `xs` ascends. */
export function interpolateAt(xs: readonly number[], ys: readonly number[], at: number): number | null {
  const last = xs.length - 1;
  if (last < 0 || at < xs[0] || at > xs[last]) return null;
  const i = Math.min(bisectRight(xs, at), last);
  const span = xs[i] - xs[i - 1];
  if (i === 0 || span === 0) return ys[i];
  return ys[i - 1] + ((ys[i] - ys[i - 1]) * (at - xs[i - 1])) / span;
}
