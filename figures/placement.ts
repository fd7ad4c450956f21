import type { Interval, Scale } from './geometry';

/** The four numbers that say where an axis puts its values: its ends, and their pixels. */
export const placementOf = ({ domain: [low, high], at }: { readonly domain: Interval; readonly at: Scale }): number[] => [
  low,
  high,
  at(low),
  at(high),
];
