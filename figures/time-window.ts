import { tickStep } from 'd3-array';
import type { Analysis } from '@/contract';
import type { Interval } from './geometry';

type Responses = Pick<Analysis, 'timeResponse'>;
export type ResponseKind = 'reference' | 'load';

/** Where a response ends, s; 0 where there is none. */
export const endOfResponse = ({ timeResponse }: Responses, kind: ResponseKind): number => timeResponse?.[kind]?.time.at(-1) ?? 0;

/** A time axis that ends at `end` s or a little later, at a half step of its ticks; one second where there is nothing to show. */
export function wholeTimes(end: number): number {
  if (end === 0) return 1;
  const step = tickStep(0, end, 4) / 2;
  return Math.ceil((end / step) * (1 - 1e-9)) * step;
}

/** From 0 to where the longer response of a loop ends, rounded up to a half step of its ticks. Seconds. */
export function timeWindow(loop: Responses): Interval {
  return [0, wholeTimes(Math.max(endOfResponse(loop, 'reference'), endOfResponse(loop, 'load')))];
}
