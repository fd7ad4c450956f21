import { grow, type Point, type Rect, type Scale } from './geometry';
import { createPathPen } from './path-pen';
import { remember } from './remember';

/**
 * A curve in pixels. Points that are not finite break it. Plain arrays: a typed one has its memory outside the page's heap, and in a browser
 * costs more to make than the few hundred points of a curve cost to compute.
 */
export interface Polyline {
  readonly x: readonly number[];
  readonly y: readonly number[];
}

/** What lies outside is cut this far off the picture, so that line ends and joins never show. */
const CUT = 6;

/** Maps two series of one length through their scales. */
export function toPolyline(xs: ArrayLike<number>, ys: ArrayLike<number>, toX: Scale, toY: Scale): Polyline {
  const length = Math.min(xs.length, ys.length);
  const [x, y]: [number[], number[]] = [[], []];
  for (let i = 0; i < length; i++) {
    x.push(toX(xs[i]));
    y.push(toY(ys[i]));
  }
  return { x, y };
}

export const pointAt = (line: Polyline, i: number): Point => ({ x: line.x[i], y: line.y[i] });

/**
 * The part of a segment inside a rectangle as two parameters in 0..1; null where there is none.
 *
 * @see Liang and Barsky, "A new concept and method for line clipping", ACM Transactions on Graphics 3(1), 1984
 */
export function clipSegment(from: Point, to: Point, rect: Rect): [number, number] | null {
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  let enter = 0;
  let leave = 1;
  const edges = [
    [-dx, from.x - rect.x],
    [dx, rect.x + rect.width - from.x],
    [-dy, from.y - rect.y],
    [dy, rect.y + rect.height - from.y],
  ];
  for (const [direction, distance] of edges) {
    if (direction === 0) {
      if (distance < 0) return null;
      continue;
    }
    const t = distance / direction;
    if (direction < 0) enter = Math.max(enter, t);
    else leave = Math.min(leave, t);
    if (enter > leave) return null;
  }
  return [enter, leave];
}

const isFinitePoint = ({ x, y }: Point): boolean => Number.isFinite(x) && Number.isFinite(y);
const along = (from: Point, to: Point, t: number): Point => ({ x: from.x + (to.x - from.x) * t, y: from.y + (to.y - from.y) * t });

const boundsOf = ({ x, y, width, height }: Rect): number[] => [x, y, width, height];

const paths = remember<Polyline, string>();

/** SVG path data of a curve, cut a little outside `bounds` and without points that a screen cannot show. Empty where nothing is inside. */
export const polylinePath = (line: Polyline, bounds: Rect): string =>
  paths(line, boundsOf(bounds), () => drawPath(line, grow(bounds, CUT)));

function drawPath(line: Polyline, rect: Rect): string {
  const pen = createPathPen();
  let down = false;
  for (let i = 1; i < line.x.length; i++) {
    const from = pointAt(line, i - 1);
    const to = pointAt(line, i);
    const part = isFinitePoint(from) && isFinitePoint(to) ? clipSegment(from, to, rect) : null;
    if (part === null) {
      down = false;
      continue;
    }
    if (!down || part[0] > 0) pen.moveTo(along(from, to, part[0]));
    pen.lineTo(along(from, to, part[1]));
    down = part[1] === 1;
  }
  return pen.path();
}

/** Points of a thinned curve are this far apart, and outside the picture there are none. */
const THIN_STEP = 4;

const thin = remember<Polyline, Polyline>();

/** What of a curve is inside `bounds`, in segments just long enough to tell what it covers. NaN parts the pieces. */
export const thinned = (line: Polyline, bounds: Rect): Polyline => thin(line, boundsOf(bounds), () => thinOut(line, grow(bounds, CUT)));

function thinOut(line: Polyline, rect: Rect): Polyline {
  const [x, y]: [number[], number[]] = [[], []];
  for (let i = 1; i < line.x.length; i++) {
    const [from, to] = [pointAt(line, i - 1), pointAt(line, i)];
    const part = isFinitePoint(from) && isFinitePoint(to) ? clipSegment(from, to, rect) : null;
    if (part === null) {
      if (x.length > 0 && !Number.isNaN(x[x.length - 1])) pushPoint(x, y, { x: NaN, y: NaN });
      continue;
    }
    if (x.length === 0 || Number.isNaN(x[x.length - 1])) pushPoint(x, y, along(from, to, part[0]));
    const last = part[1] < 1 || i === line.x.length - 1;
    const end = along(from, to, part[1]);
    const length = Math.hypot(end.x - x[x.length - 1], end.y - y[y.length - 1]);
    if (length < THIN_STEP && !last) continue;
    const pieces = Math.ceil(length / (2 * THIN_STEP));
    const start = { x: x[x.length - 1], y: y[y.length - 1] };
    for (let k = 1; k <= pieces; k++) pushPoint(x, y, along(start, end, k / pieces));
  }
  return { x, y };
}

function pushPoint(x: number[], y: number[], point: Point): void {
  x.push(point.x);
  y.push(point.y);
}
