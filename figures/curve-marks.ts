import { contains, type Point, type Rect, round2 } from './geometry';
import type { Polyline } from './polyline';

/** A place on a curve with the direction in which the curve runs there, in degrees clockwise from the right. */
export interface CurveMark {
  readonly point: Point;
  readonly angle: number;
}

const ARROW_PITCH = 170;
const MOST_ARROWS = 4;

/** Head 11 × 10 with its tip in the direction of travel, about the origin. */
export const arrowheadPath = 'M-5.5 -5L5.5 0L-5.5 5L-3 0Z';

const angleOf = (dx: number, dy: number): number => (Math.atan2(dy, dx) * 180) / Math.PI;

/** Arrowheads spread evenly over what is seen of a curve, in the direction of its points. */
export function arrowheads(line: Polyline, bounds: Rect): CurveMark[] {
  const inside = (i: number) => contains(bounds, { x: line.x[i], y: line.y[i] }, 8);
  const step = (i: number) => (inside(i) && inside(i + 1) ? Math.hypot(line.x[i + 1] - line.x[i], line.y[i + 1] - line.y[i]) : 0);
  const last = line.x.length - 1;
  let length = 0;
  for (let i = 0; i < last; i++) length += step(i);
  const count = Math.min(MOST_ARROWS, Math.round(length / ARROW_PITCH));
  const marks: CurveMark[] = [];
  let run = 0;
  for (let i = 0; i < last && marks.length < count; i++) {
    const s = step(i);
    const target = ((marks.length + 0.5) / count) * length;
    if (s > 0 && run + s >= target) {
      const t = (target - run) / s;
      const dx = line.x[i + 1] - line.x[i];
      const dy = line.y[i + 1] - line.y[i];
      marks.push({ point: { x: line.x[i] + t * dx, y: line.y[i] + t * dy }, angle: angleOf(dx, dy) });
    }
    run += s;
  }
  return marks;
}

/** A short bar across the curve at a mark. */
export function postPath({ point, angle }: CurveMark, half = 5): string {
  const a = ((angle + 90) * Math.PI) / 180;
  const dx = half * Math.cos(a);
  const dy = half * Math.sin(a);
  return `M${round2(point.x - dx)} ${round2(point.y - dy)}L${round2(point.x + dx)} ${round2(point.y + dy)}`;
}

export interface Post extends CurveMark {
  readonly text: string;
}

/** Posts of `candidates` that are seen and keep `pitch` pixels from those before them. */
export function legiblePosts(candidates: readonly Post[], bounds: Rect, pitch = 26): Post[] {
  const kept: Post[] = [];
  for (const post of candidates) {
    const clear = kept.every(({ point }) => Math.hypot(point.x - post.point.x, point.y - post.point.y) >= pitch);
    if (clear && contains(bounds, post.point, 4)) kept.push(post);
  }
  return kept;
}
