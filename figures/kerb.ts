import { type Point, round2 } from './geometry';

/** A limit and the blocks beyond it, as SVG path data: `edge` is the limit line, `ground` the whole strip, `blocks` the red ones. */
export interface StraightKerb {
  readonly edge: string;
  readonly ground: string;
  readonly blocks: string;
  readonly count: number;
}

export interface StraightKerbOptions {
  from: Point;
  to: Point;
  thickness?: number;
  block?: number;
  /** The forbidden side, seen in the direction of travel with y downwards. */
  side: 'left' | 'right';
}

const quad = (corners: readonly Point[]): string => `M${corners.map((p) => `${round2(p.x)} ${round2(p.y)}`).join('L')}Z`;

/** Kerb along a straight limit. Blocks are whole, the first is red, and all lie on the forbidden side. */
export function straightKerb({ from, to, thickness = 6, block = 10, side }: StraightKerbOptions): StraightKerb {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const count = Math.max(1, Math.round(length / block));
  const unit = length === 0 ? { x: 1, y: 0 } : { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  const sign = side === 'right' ? 1 : -1;
  const place = (s: number, t: number): Point => ({
    x: from.x + unit.x * s - unit.y * t * sign,
    y: from.y + unit.y * s + unit.x * t * sign,
  });
  const strip = (s0: number, s1: number) => quad([place(s0, 0), place(s1, 0), place(s1, thickness), place(s0, thickness)]);
  let blocks = '';
  for (let i = 0; i < count; i += 2) blocks += strip((i * length) / count, ((i + 1) * length) / count);
  return { edge: `M${round2(from.x)} ${round2(from.y)}L${round2(to.x)} ${round2(to.y)}`, ground: strip(0, length), blocks, count };
}

/** Kerb round a circular limit, blocks inside: a ring of `width` at `middle`, dashed in equal blocks of an even count. */
export interface CircleKerb {
  readonly middle: number;
  readonly inner: number;
  readonly width: number;
  readonly dash: number;
  readonly count: number;
}

const evenCount = (length: number, block: number): number => Math.max(2, 2 * Math.round(length / block / 2));

export function circleKerb(radius: number, thickness = 7, block = 11): CircleKerb {
  const width = Math.min(thickness, radius / 2);
  const middle = radius - width / 2;
  const count = evenCount(2 * Math.PI * middle, block);
  return { middle, inner: radius - width, width, dash: (2 * Math.PI * middle) / count, count };
}

/** Length of a closed outline. */
export function outlineLength(points: readonly Point[]): number {
  return points.reduce((sum, p, i) => {
    const next = points[(i + 1) % points.length];
    return sum + Math.hypot(next.x - p.x, next.y - p.y);
  }, 0);
}

/** Kerb inside any closed limit: stroke twice the thickness, clipped to the inside, dashed in an even count of equal blocks. */
export interface ClosedKerb {
  readonly outline: string;
  readonly strokeWidth: number;
  readonly dash: number;
  readonly count: number;
}

export function closedKerb(points: readonly Point[], thickness = 6, block = 10): ClosedKerb {
  const length = outlineLength(points);
  const count = evenCount(length, block);
  return { outline: quad(points), strokeWidth: 2 * thickness, dash: length / count, count };
}
