import type { Point, Rect } from './geometry';
import type { Polyline } from './polyline';
import { textWidth } from './text-width';

export type Anchor = 'start' | 'middle' | 'end';

/** Where a label's baseline starts, ends or has its middle. */
export interface LabelPlace extends Point {
  readonly anchor: Anchor;
}

export interface PlacedLabel extends LabelPlace {
  readonly box: Rect;
}

export interface Paper {
  /** The picture: labels stay inside. */
  readonly bounds: Rect;
  /** Curves that a label never covers, thinned. */
  readonly curves: readonly Polyline[];
  /** Labels, marks and kerbs that stand already. */
  readonly taken: readonly Rect[];
  /** Grounds and thin curves, covered only where there is no free paper. */
  readonly shaded?: readonly Rect[];
  readonly faint?: readonly Polyline[];
}

const COST = { outside: 1000, curve: 400, taken: 200, shaded: 4, faint: 2, later: 0.1 };
const PAD = 2;

/** The box of a text of one or more lines on a baseline. */
export function labelBox(place: LabelPlace, lines: readonly string[], size = 13): Rect {
  const width = Math.max(...lines.map((line) => textWidth(line, size)));
  const left = { start: 0, middle: width / 2, end: width }[place.anchor];
  return { x: place.x - left - PAD, y: place.y - size * 0.8 - PAD, width: width + 2 * PAD, height: size + (lines.length - 1) * 16 + PAD };
}

const overlaps = (a: Rect, b: Rect): boolean => a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

const isInside = (box: Rect, bounds: Rect): boolean =>
  box.x >= bounds.x && box.y >= bounds.y && box.x + box.width <= bounds.x + bounds.width && box.y + box.height <= bounds.y + bounds.height;

/** Curves are handed in thinned to short segments, so that the box of a segment stands for it. */
function crosses({ x, y }: Polyline, box: Rect): boolean {
  const [right, bottom] = [box.x + box.width, box.y + box.height];
  for (let i = 1; i < x.length; i++) {
    if (Math.max(x[i - 1], x[i]) < box.x || Math.min(x[i - 1], x[i]) > right) continue;
    if (Math.max(y[i - 1], y[i]) >= box.y && Math.min(y[i - 1], y[i]) <= bottom) return true;
  }
  return false;
}

function costOf(box: Rect, paper: Paper): number {
  const outside = isInside(box, paper.bounds) ? 0 : COST.outside;
  const curves = paper.curves.filter((curve) => crosses(curve, box)).length * COST.curve;
  const taken = paper.taken.filter((rect) => overlaps(rect, box)).length * COST.taken;
  const shaded = (paper.shaded ?? []).filter((rect) => overlaps(rect, box)).length * COST.shaded;
  const faint = (paper.faint ?? []).some((curve) => crosses(curve, box)) ? COST.faint : 0;
  return outside + curves + taken + shaded + faint;
}

/** The candidate in the freest paper: inside, on no curve, on nothing that stands already, on grounds and thin curves last. Earlier ones are preferred. */
export function placeLabel(lines: readonly string[], candidates: readonly LabelPlace[], paper: Paper, size = 13): PlacedLabel {
  if (candidates.length === 0) throw new Error('A label needs at least one place.');
  let best: PlacedLabel = { ...candidates[0], box: labelBox(candidates[0], lines, size) };
  let least = costOf(best.box, paper);
  for (let i = 1; i < candidates.length && least > i * COST.later; i++) {
    const box = labelBox(candidates[i], lines, size);
    const cost = costOf(box, paper) + i * COST.later;
    if (cost < least) {
      least = cost;
      best = { ...candidates[i], box };
    }
  }
  return best;
}

const DIRECTIONS = [20, -20, 160, -160, 60, -60, 120, -120, 0, 180, 90, -90];

/** Places round a point, nearest first: the baseline starts, ends or is centred so that the text lies away from the point. */
export function placesAround(point: Point, distances: readonly number[]): LabelPlace[] {
  return distances.flatMap((distance) =>
    DIRECTIONS.map((degrees) => {
      const a = (degrees * Math.PI) / 180;
      const dx = Math.cos(a);
      const anchor: Anchor = dx > 0.3 ? 'start' : dx < -0.3 ? 'end' : 'middle';
      return { x: point.x + distance * dx, y: point.y + distance * Math.sin(a) + 4.5, anchor };
    }),
  );
}
