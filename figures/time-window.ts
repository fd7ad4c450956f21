import { tickStep } from 'd3-array';
import type { Analysis } from '@/contract';
import type { Interval } from './geometry';

const endOf = ({ timeResponse }: Pick<Analysis, 'timeResponse'>): number => {
  const ends = [timeResponse?.reference, timeResponse?.load].map((series) => series?.time.at(-1) ?? 0);
  return Math.max(...ends);
};

/** From 0 to where the longer response of a loop ends, rounded up to a half step of its ticks. Seconds; one second where there is no response. */
export function timeWindow(loop: Pick<Analysis, 'timeResponse'>): Interval {
  const end = endOf(loop);
  if (end === 0) return [0, 1];
  const step = tickStep(0, end, 4) / 2;
  return [0, Math.ceil((end / step) * (1 - 1e-9)) * step];
}
