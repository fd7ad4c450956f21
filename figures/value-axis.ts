import { formatNumber } from './format';
import type { Interval } from './geometry';
import { type Axis, linearScale, multiples, niceDomain, stepDecimals } from './linear-axis';

/** Pixels that a label on an upright axis needs. */
const LABEL_PITCH = 26;

/** An upright axis over `extent`, widened to whole steps, lowest value at the foot: `range` is [foot, head] in pixels. */
export function valueAxis(extent: Interval, range: Interval): Axis {
  const count = Math.max(2, Math.floor(Math.abs(range[1] - range[0]) / LABEL_PITCH));
  const { domain, step } = niceDomain(extent, Math.min(count, 5));
  return axisWithStep(domain, step, range);
}

/** An upright axis with a step that was chosen. */
export function axisWithStep(domain: Interval, step: number, range: Interval): Axis {
  const decimals = stepDecimals(step);
  return {
    domain,
    ticks: multiples(step, domain).map((value) => ({ value, text: formatNumber(value, decimals) })),
    at: linearScale(domain, range),
  };
}
