import { tickStep } from 'd3-array';
import { formatNumber } from './format';
import type { Interval, Scale } from './geometry';
import { linearScale, multiples, stepDecimals } from './linear-axis';

export interface TimeTick {
  readonly x: number;
  readonly text: string | null;
}

export interface TimeAxis {
  readonly domain: Interval;
  readonly at: Scale;
  readonly invert: Scale;
  readonly ticks: readonly TimeTick[];
}

const LABEL_PITCH = 64;

/** A time axis from 0 to `duration` s; every second tick is named, the last one with its unit. */
export function timeAxis(duration: number, pixels: Interval): TimeAxis {
  const width = pixels[1] - pixels[0];
  const step = tickStep(0, duration, Math.max(2, Math.floor(width / LABEL_PITCH)));
  const domain: Interval = [0, duration];
  const at = linearScale(domain, pixels);
  const named = multiples(step, domain);
  const between = multiples(step / 2, domain).filter((value) => !named.includes(value));
  const decimals = stepDecimals(step);
  const label = (value: number, i: number) => formatNumber(value, decimals) + (i === named.length - 1 ? ' s' : '');
  return {
    domain,
    at,
    invert: linearScale(pixels, domain),
    ticks: [
      ...named.map((value, i) => ({ x: at(value), text: label(value, i) })),
      ...between.map((value) => ({ x: at(value), text: null })),
    ],
  };
}
