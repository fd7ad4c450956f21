import { shortNumber } from './format';
import { clamp, type Interval } from './geometry';
import { type Axis, finiteExtent, multiples } from './linear-axis';
import { fromDecibels, type MagnitudeUnit } from './units';
import { axisWithStep } from './value-axis';

const DECIBEL_LIMITS: Interval = [-60, 60];
const LEAST_PLANT_SPAN = 20;
const LARGEST_PLANT_SPAN = 120;
const DECIBEL_STEPS = [5, 10, 20, 40, 60];
const DEGREE_STEPS = [45, 90, 180, 360];
const ROUND_DEGREES = 15;
const LARGEST_PHASE_SPAN = 540;
const LABEL_PITCH = 25;

const stepFor = (steps: readonly number[], span: number, pixels: number): number =>
  steps.find((step) => (span / step) * LABEL_PITCH <= pixels) ?? steps[steps.length - 1];

/** The axis of |L|, in decibels inside: from the least to the greatest value, 0 dB always among them, no further than ±60 dB. */
export function magnitudeAxis(decibels: Iterable<number>, range: Interval, unit: MagnitudeUnit): Axis {
  const [low, high] = finiteExtent(decibels) ?? [-20, 20];
  return decibelAxis([clamp(low, DECIBEL_LIMITS[0], -10), clamp(high, 10, DECIBEL_LIMITS[1])], range, unit);
}

/** The axis of |P|: its size depends on the plant's units, so it lies where the values are. Of a wide span the upper part is kept. */
export function plantMagnitudeAxis(decibels: Iterable<number>, range: Interval, unit: MagnitudeUnit): Axis {
  const [low, high] = finiteExtent(decibels) ?? [-20, 20];
  return decibelAxis([Math.max(Math.min(low, high - LEAST_PLANT_SPAN), high - LARGEST_PLANT_SPAN), high], range, unit);
}

function decibelAxis([bottom, top]: Interval, range: Interval, unit: MagnitudeUnit): Axis {
  const pixels = Math.abs(range[1] - range[0]);
  const step = stepFor(unit === 'dB' ? DECIBEL_STEPS : [20, 40, 60], top - bottom, pixels);
  const axis = axisWithStep([Math.floor(bottom / 10) * 10, Math.ceil(top / 10) * 10], step, range);
  if (unit === 'dB') return axis;
  return { ...axis, ticks: axis.ticks.map(({ value }) => ({ value, text: shortNumber(fromDecibels(value), 1) })) };
}

/**
 * The axis of arg L in degrees. An odd half turn (−180° or a copy) is always inside, with `beside` degrees on both sides of it;
 * of a span of more than a turn and a half the upper part is kept.
 */
export function phaseAxis(degrees: Iterable<number>, range: Interval, beside = 45): Axis {
  const [low, high] = finiteExtent(degrees) ?? [-270, -90];
  const reference = nearestOddHalfTurn((Math.max(low, high - LARGEST_PHASE_SPAN) + high) / 2);
  const top = Math.max(high, reference + beside);
  const bottom = Math.max(Math.min(low, reference - beside), top - LARGEST_PHASE_SPAN);
  const step = stepFor(DEGREE_STEPS, top - bottom, Math.abs(range[1] - range[0]));
  return axisWithStep([Math.floor(bottom / ROUND_DEGREES) * ROUND_DEGREES, Math.ceil(top / ROUND_DEGREES) * ROUND_DEGREES], step, range);
}

/** −180° and its copies every turn: where a loop's phase leaves no margin. */
export const nearestOddHalfTurn = (degrees: number): number => Math.round((degrees - 180) / 360) * 360 + 180;

/** All odd half turns inside an interval of degrees. */
export const oddHalfTurns = ([low, high]: Interval): number[] => multiples(360, [low - 180, high - 180]).map((turn) => turn + 180);
