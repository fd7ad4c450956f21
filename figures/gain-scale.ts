import { logScale } from './log-scale';
import type { Interval, Scale } from './geometry';
import { linearScale } from './linear-axis';

/** How the rule's scale runs: by factors, or by differences and through zero. */
export type GainMode = 'log' | 'linear';

export interface GainScaleInput {
  value: number;
  width: number;
  mode: GainMode;
  /** Log: the factor from end to end. */
  span: number;
  /** Linear: the difference from end to end. */
  linearSpan: number;
}

export interface GainScale {
  readonly domain: Interval;
  readonly at: Scale;
  /** Pixel → gain. */
  readonly invert: Scale;
}

/** Factor from end to end of the rule. */
export const gainSpans = { phone: 3.2, wide: 4 } as const;

/** Linear where a factor means nothing: the gain, or the kept one, is 0 or negative. */
export const gainMode = (value: number, kept: number | null): GainMode => (value > 0 && (kept === null || kept > 0) ? 'log' : 'linear');

/** End to end of a linear rule: four times the largest gain about, or `fallback` where all of them are 0. */
export function linearSpanOf(value: number, kept: number | null, fallback: number): number {
  const size = Math.max(Math.abs(value), Math.abs(kept ?? 0));
  return size > 0 ? 4 * size : fallback;
}

/** The sliding scale under a needle that stands in the middle. */
export function gainScale({ value, width, mode, span, linearSpan }: GainScaleInput): GainScale {
  const pixels: Interval = [0, width];
  if (mode === 'linear') {
    const domain: Interval = [value - linearSpan / 2, value + linearSpan / 2];
    return { domain, at: linearScale(domain, pixels), invert: linearScale(pixels, domain) };
  }
  const domain: Interval = [value / Math.sqrt(span), value * Math.sqrt(span)];
  return { domain, ...logScale(domain, pixels) };
}

const DRAG_FIGURES = 3;
const FINE_FIGURES = 4;

/** A gain rounded to what a hand can aim at, so that round values and 0 are met. */
export function roundGain(value: number, { mode, linearSpan }: Pick<GainScaleInput, 'mode' | 'linearSpan'>, fine = false): number {
  const figures = fine ? FINE_FIGURES : DRAG_FIGURES;
  if (mode === 'log') return Number(value.toPrecision(figures));
  const quantum = 10 ** (Math.floor(Math.log10(linearSpan)) - figures + 1);
  return Number((Math.round(value / quantum) * quantum).toPrecision(12)) || 0;
}

/** The gain after the scale was dragged `dx` pixels: what lay left of the needle comes under it when the scale moves right. */
export function draggedGain(scale: GainScaleInput, dx: number, fine = false): number {
  const { invert } = gainScale(scale);
  return roundGain(invert(scale.width / 2 - dx * (fine ? 0.1 : 1)), scale, fine);
}

/** The gain a nudge later: a fraction of the gain itself, or on a linear rule of a quarter of its span. */
export function nudgedGain(scale: GainScaleInput, fraction: number): number {
  const moved = scale.mode === 'log' ? scale.value * (1 + fraction) : scale.value + (scale.linearSpan / 4) * fraction;
  return roundGain(moved, scale, Math.abs(fraction) < 0.01 || scale.mode === 'log');
}
