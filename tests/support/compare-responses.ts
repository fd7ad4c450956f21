import { bisectLeft } from 'd3-array';
import type { Analysis, TimeMetrics } from '@/contract';
import { Misses, type Tolerance } from './misses';
import type { ReferenceLoop } from './reference-loop';

type Time = NonNullable<ReferenceLoop['time']>;

/** Of the response's own peak: the series is drawn, so values between its points are interpolated. */
const OF_PEAK = 2e-3;

const metricTolerances: Partial<Record<keyof TimeMetrics, Tolerance>> = {
  overshootPercent: { relative: 1e-3, absolute: 0.02 },
  riseTime: { relative: 2e-3 },
  settlingTime: { relative: 5e-3 },
  steadyStateError: { relative: 1e-6, absolute: 1e-8 },
};

function valueAt({ time, output }: { time: number[]; output: number[] }, t: number): number {
  const k = Math.max(1, bisectLeft(time, t));
  const share = (t - time[k - 1]) / (time[k] - time[k - 1]);
  return output[k - 1] + share * (output[k] - output[k - 1]);
}

/** Both step responses at the reference's times, which the axis must reach. */
export function compareSeries({ timeResponse }: Analysis, time: Time): string[] {
  const misses = new Misses();
  for (const key of ['reference', 'load'] as const) {
    const series = timeResponse?.[key];
    if (!series) return [`there is no ${key} response`];
    const absolute = OF_PEAK * Math.max(...time[key].map(Math.abs));
    time.times.forEach((t, i) => misses.compare(`${key} at ${t} s`, valueAt(series, t), time[key][i], { absolute }));
  }
  return misses.lines;
}

/** The metrics that the reference gives, from the axis that the engine chose. */
export function compareMetrics({ timeResponse }: Analysis, { metrics }: Time): string[] {
  const misses = new Misses();
  for (const [key, tolerance] of Object.entries(metricTolerances) as [keyof TimeMetrics, Tolerance][]) {
    if (metrics[key] != null) misses.compare(key, timeResponse?.metrics?.[key], metrics[key], tolerance);
  }
  return misses.lines;
}
