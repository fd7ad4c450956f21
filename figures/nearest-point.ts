import type { Point } from './geometry';
import type { Polyline } from './polyline';

/** Place on a curve: between points `index` and `index + 1`, `fraction` of the way. */
export interface CurvePlace {
  readonly index: number;
  readonly fraction: number;
  readonly distance: number;
}

function onSegment(line: Polyline, index: number, point: Point): CurvePlace {
  const dx = line.x[index + 1] - line.x[index];
  const dy = line.y[index + 1] - line.y[index];
  const length2 = dx * dx + dy * dy;
  const raw = length2 === 0 ? 0 : ((point.x - line.x[index]) * dx + (point.y - line.y[index]) * dy) / length2;
  const fraction = Math.max(0, Math.min(1, raw));
  const distance = Math.hypot(line.x[index] + fraction * dx - point.x, line.y[index] + fraction * dy - point.y);
  return { index, fraction, distance };
}

/** The place on a curve that is nearest to a point; null for a curve of fewer than two points. */
export function nearestPlace(line: Polyline, point: Point): CurvePlace | null {
  let best: CurvePlace | null = null;
  for (let i = 0; i + 1 < line.x.length; i++) {
    const place = onSegment(line, i, point);
    if (Number.isFinite(place.distance) && (best === null || place.distance < best.distance)) best = place;
  }
  return best;
}

/** The frequency at a place, interpolated logarithmically. */
export function frequencyAtPlace(frequencies: ArrayLike<number>, { index, fraction }: CurvePlace): number {
  return frequencies[index] * (frequencies[index + 1] / frequencies[index]) ** fraction;
}
