import { frequencyIn, type FrequencyUnit, magnitudeIn, type MagnitudeUnit } from './units';

const MINUS = '\u2212';
const LARGEST_PLAIN = 1e9;
const SMALLEST_PLAIN = 1e-6;

/** A minus as typography writes it. */
export const typographicMinus = (text: string): string => text.replace(/-/g, MINUS);

const groupThousands = (whole: string): string => whole.replace(/\B(?=(\d{3})+(?!\d))/g, ',');

function plain(value: number, decimals: number): string {
  const [whole, fraction] = Math.abs(value).toFixed(decimals).split('.');
  const digits = fraction === undefined ? groupThousands(whole) : `${groupThousands(whole)}.${fraction}`;
  return value < 0 && /[1-9]/.test(digits) ? MINUS + digits : digits;
}

/**
 * A number with fixed decimals, thousands commas and a true minus; from 1e9 on as "1.23e9". A value that is not finite has no
 * number: it is the infinity sign or an en dash.
 *
 * @example formatNumber(-1380.25, 1) // "−1,380.3"
 */
export function formatNumber(value: number, decimals: number): string {
  if (Number.isNaN(value)) return '–';
  if (!Number.isFinite(value)) return value > 0 ? '∞' : `${MINUS}∞`;
  if (Math.abs(value) >= LARGEST_PLAIN) return typographicMinus(value.toExponential(2).replace('e+', 'e'));
  return plain(value, decimals);
}

/** Decimals that show `figures` significant figures of a value, never negative. */
export function decimalsFor(value: number, figures: number): number {
  if (value === 0 || !Number.isFinite(value)) return 0;
  const [, exponent] = Math.abs(value)
    .toExponential(figures - 1)
    .split('e');
  return Math.max(0, figures - 1 - Number(exponent));
}

/** A number with at most so many significant figures and no idle zeros: what ticks and limits are named by. 0.08, 1.5, 200. */
export function shortNumber(value: number, figures = 2): string {
  const rounded = Number(value.toPrecision(figures));
  const text = formatNumber(rounded, decimalsFor(rounded, figures));
  return text.includes('.') && !text.includes('e') ? text.replace(/\.?0+$/, '') : text;
}

/** A gain: three significant figures, at least two decimals, no idle zeros after those. 1.05, 0.30, 0.035, 12.35. */
export function formatGain(value: number): string {
  const size = Math.abs(value);
  if (size !== 0 && size < SMALLEST_PLAIN) return typographicMinus(value.toExponential(2));
  const text = formatNumber(value, Math.max(2, decimalsFor(value, 3)));
  return text.replace(/(\.\d\d\d*?)0+$/, '$1');
}

/** A frequency in the reader's unit, without it: two decimals, under 0.1 three significant figures, from 1,000 on five. */
export function formatFrequency(radiansPerSecond: number, unit: FrequencyUnit): string {
  const value = frequencyIn(unit, radiansPerSecond);
  const size = Math.abs(value);
  if (size >= 1000) return formatNumber(value, decimalsFor(value, 5));
  return formatNumber(value, size < 0.1 ? Math.max(2, decimalsFor(value, 3)) : 2);
}

/** |L| and gain margins: decibels to one decimal, factors to two. A factor under 0.1 keeps three significant figures. */
export function formatMagnitude(factor: number, unit: MagnitudeUnit): string {
  if (unit === 'dB') return formatNumber(magnitudeIn(unit, factor), 1);
  return formatNumber(factor, factor < 0.1 ? Math.max(2, decimalsFor(factor, 3)) : 2);
}

export const formatFactor = (factor: number): string => formatNumber(factor, 2);
export const formatDegrees = (degrees: number): string => formatNumber(degrees, 1);
export const formatSeconds = (seconds: number): string => formatNumber(seconds, 2);

/** A number and its unit, with a space between except before °. */
export function withUnit(number: string, unit: string): string {
  if (unit === '') return number;
  return unit === '°' ? number + unit : `${number} ${unit}`;
}

/** The difference of two numbers as they are printed, so that a reader can check it. */
export function formatDifference(minuend: number, subtrahend: number, decimals: number): string {
  const scale = 10 ** decimals;
  return formatNumber((Math.round(minuend * scale) - Math.round(subtrahend * scale)) / scale, decimals);
}

// A product such as 0.29·100 lies an ulp under the whole number that it means.
const wholeBelow = (value: number): number => Math.floor(value * (1 + 4 * Number.EPSILON));

/** Room in gain, a fraction, as whole per cent rounded down: never more than there is. */
export const formatRoomPercent = (fraction: number): string => `${formatNumber(wholeBelow(fraction * 100), 0)} %`;

/** Room in dead time, s, as whole milliseconds rounded down. */
export const formatRoomMilliseconds = (seconds: number): string => `${formatNumber(wholeBelow(seconds * 1000), 0)} ms`;
