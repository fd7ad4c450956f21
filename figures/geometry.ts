/** Plain shapes in CSS pixels, y downwards. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Rect {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export type Interval = readonly [number, number];

/** Maps a value in domain units to pixels. */
export type Scale = (value: number) => number;

export const round2 = (value: number): number => Math.round(value * 100) / 100;

export const clamp = (value: number, low: number, high: number): number => Math.max(low, Math.min(high, value));

export const contains = (rect: Rect, point: Point, inset = 0): boolean =>
  point.x >= rect.x + inset &&
  point.x <= rect.x + rect.width - inset &&
  point.y >= rect.y + inset &&
  point.y <= rect.y + rect.height - inset;

export const grow = (rect: Rect, by: number): Rect => ({
  x: rect.x - by,
  y: rect.y - by,
  width: rect.width + 2 * by,
  height: rect.height + 2 * by,
});
