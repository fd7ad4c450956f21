import { tickStep } from 'd3-array';
import { formatNumber } from './format';
import type { Interval } from './geometry';
import { type Axis, linearScale, multiples, stepDecimals } from './linear-axis';

/** Pixels that a label on an upright axis needs. */
const LABEL_PITCH = 26;
const MOST_STEPS = 4;
/** Pixels left free beyond the curve, for a kerb or a stroke; none beyond zero, where a picture stands. */
const HEADROOM = 9;

function padded([low, high]: Interval, pixels: number): Interval {
  if (high === low) return low === 0 ? [-1, 1] : [Math.min(0, 2 * low), Math.max(0, 2 * high)];
  const pad = ((high - low) * HEADROOM) / Math.max(1, pixels - 2 * HEADROOM);
  return [low === 0 ? 0 : low - pad, high === 0 ? 0 : high + pad];
}

/** An upright axis over `extent` with a little air and round ticks inside: `range` is [foot, head] in pixels. */
export function valueAxis(extent: Interval, range: Interval): Axis {
  const pixels = Math.abs(range[1] - range[0]);
  const domain = padded(extent, pixels);
  const count = Math.max(2, Math.min(MOST_STEPS, Math.floor(pixels / LABEL_PITCH)));
  return axisWithStep(domain, tickStep(domain[0], domain[1], count), range);
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
