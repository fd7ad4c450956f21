import { extent } from 'd3-array';
import { clamp, type Interval, type Scale } from './geometry';

export interface Tick {
  readonly value: number;
  readonly text: string;
}

export interface Axis {
  readonly domain: Interval;
  readonly ticks: readonly Tick[];
  /** Domain value → pixel. */
  readonly at: Scale;
}

/** Decimals that tell the ticks of one step apart. */
export const stepDecimals = (step: number): number => clamp(-Math.floor(Math.log10(step) + 1e-9), 0, 12);

/** A linear map of `domain` onto `range`; a domain without width maps to the middle. */
export function linearScale([low, high]: Interval, [from, to]: Interval): Scale {
  if (high === low) return () => (from + to) / 2;
  const slope = (to - from) / (high - low);
  return (value) => from + (value - low) * slope;
}

/** Least and greatest of the finite values; null where there are none. */
export function finiteExtent(values: Iterable<number>): [number, number] | null {
  const finite: number[] = [];
  for (const value of values) if (Number.isFinite(value)) finite.push(value);
  const [low, high] = extent(finite);
  return low === undefined || high === undefined ? null : [low, high];
}

/** Round values of a step inside an interval, without −0 or the dust of repeated addition. */
export function multiples(step: number, [low, high]: Interval): number[] {
  const slack = 1e-9 * (high - low);
  const first = Math.ceil((low - slack) / step);
  const last = Math.floor((high + slack) / step);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => Number(((first + i) * step).toPrecision(12)) || 0);
}
