import type { Analysis, FrequencyResponse } from '@/contract';
import { linearScale } from './linear-axis';
import type { Interval, Point, Rect, Scale } from './geometry';

/** The part of the plane that is drawn, in the plane's own units; the same scale both ways. */
export interface NyquistWindow {
  readonly real: Interval;
  readonly imaginary: Interval;
}

export interface NyquistView extends NyquistWindow {
  readonly toX: Scale;
  readonly toY: Scale;
  readonly pixelsPerUnit: number;
  readonly toPixel: (re: number, im: number) => Point;
}

/** −1, its contours, the origin and the way L takes between them. */
const NEAR: NyquistWindow = { real: [-2.3, 0.6], imaginary: [-1.2, 0.7] };
/** Where L turns round −1 further out, the picture grows to one of these. */
const LEFT_STOPS = [2.3, 3, 4, 6];
const RIGHT_STOPS = [0.6, 1.1];
/** How far beyond the last crossing the picture reaches. */
const BEYOND = 1.15;

const stopFor = (stops: readonly number[], needed: number): number => stops.find((stop) => stop >= needed) ?? stops[stops.length - 1];

/** How far left of 0 the curve crosses the real axis, of the crossings that a picture can hold. */
function furthestCrossing({ margins }: Pick<Analysis, 'margins'>): number {
  const sizes = margins.phaseCrossovers
    .map((c) => 1 / c.gainMarginFactor)
    .filter((size) => size * BEYOND <= LEFT_STOPS[LEFT_STOPS.length - 1]);
  return Math.max(0, ...sizes);
}

function reach({ loop }: FrequencyResponse, left: number): { right: number; up: number; down: number } {
  let [right, up, down] = [0, 0, 0];
  const isWide = left > LEFT_STOPS[0];
  loop.magnitude.forEach((magnitude, i) => {
    if (magnitude <= 1) right = Math.max(right, loop.real[i]);
    if (magnitude > (isWide ? left : 1)) return;
    up = Math.max(up, loop.imaginary[i]);
    if (isWide) down = Math.max(down, -loop.imaginary[i]);
  });
  return { right, up, down };
}

/** What of the plane is worth drawing for some loops: the surroundings of −1, and where needed the turn that L takes round it. */
export function nyquistWindow(loops: readonly Pick<Analysis, 'margins' | 'frequencyResponse'>[]): NyquistWindow {
  const left = stopFor(LEFT_STOPS, Math.max(...loops.map(furthestCrossing)) * BEYOND);
  const reaches = loops.flatMap(({ frequencyResponse }) => (frequencyResponse === undefined ? [] : [reach(frequencyResponse, left)]));
  const furthest = (side: 'right' | 'up' | 'down') => Math.max(0, ...reaches.map((r) => r[side]));
  const right = stopFor(RIGHT_STOPS, furthest('right'));
  const up = stopFor(
    [-NEAR.real[1], 0.7, 1.2, ...LEFT_STOPS].filter((s) => s > 0),
    furthest('up') * 1.05,
  );
  const down = stopFor([1.2, ...LEFT_STOPS], furthest('down') * 1.05);
  return { real: [-left, right], imaginary: [-down, up] };
}

/** Fits a window into a picture with one scale for both axes; the direction with room to spare shows more on both sides. */
export function nyquistView(window: NyquistWindow, plot: Rect): NyquistView {
  const width = window.real[1] - window.real[0];
  const height = window.imaginary[1] - window.imaginary[0];
  const pixelsPerUnit = Math.max(1e-6, Math.min(plot.width / width, plot.height / height));
  const spread = ([low, high]: Interval, pixels: number): Interval => {
    const spare = (pixels / pixelsPerUnit - (high - low)) / 2;
    return [low - spare, high + spare];
  };
  const real = spread(window.real, plot.width);
  const imaginary = spread(window.imaginary, plot.height);
  const toX = linearScale(real, [plot.x, plot.x + plot.width]);
  const toY = linearScale(imaginary, [plot.y + plot.height, plot.y]);
  return { real, imaginary, toX, toY, pixelsPerUnit, toPixel: (re, im) => ({ x: toX(re), y: toY(im) }) };
}
