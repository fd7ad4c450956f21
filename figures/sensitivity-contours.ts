import type { Point } from './geometry';
import { toDecibels } from './units';

/** |S| = s is the circle of radius 1/s round −1. */
export const contourRadius = (sensitivity: number): number => 1 / sensitivity;

/** A point of the contour |S| = s in the plane of L; `angle` is in radians from −1. */
export function contourPoint(sensitivity: number, angle: number): { re: number; im: number } {
  return { re: -1 + Math.cos(angle) / sensitivity, im: Math.sin(angle) / sensitivity };
}

/** L as Nichols draws it: phase in (−360°, 0], so that −1 stands at −180°, and decibels. */
export function toNichols({ re, im }: { re: number; im: number }): { phaseDegrees: number; decibels: number } {
  const degrees = (Math.atan2(im, re) * 180) / Math.PI;
  return { phaseDegrees: degrees > 0 ? degrees - 360 : degrees, decibels: toDecibels(Math.hypot(re, im)) };
}

const CONTOUR_POINTS = 120;

/** The contour |S| = s > 1 on Nichols as a closed outline about −180° + `turn` degrees, mapped to pixels. */
export function nicholsContour(sensitivity: number, turn: number, toPixel: (phaseDegrees: number, decibels: number) => Point): Point[] {
  return Array.from({ length: CONTOUR_POINTS }, (_, i) => {
    const { phaseDegrees, decibels } = toNichols(contourPoint(sensitivity, (2 * Math.PI * i) / CONTOUR_POINTS));
    return toPixel(phaseDegrees + turn, decibels);
  });
}

/** Contours that are shaded, that are drawn, and of those the strong ones, which are named. */
export const contourLevels = {
  shaded: [1.2, 1.4, 1.7, 2, 3, 6],
  fine: [1.1, 1.3, 1.5, 1.6, 2.5, 4, 6, 10],
  strong: [1.2, 1.4, 2, 3],
} as const;

/** The contours whose outline is at least `pitch` pixels inside the one before: where a picture is small, few are drawn. */
export function legibleContours(levels: readonly number[], pixelsPerUnit: number, pitch: number): number[] {
  const kept: number[] = [];
  let outer = Infinity;
  for (const level of levels) {
    const radius = contourRadius(level) * pixelsPerUnit;
    if (outer - radius < pitch || radius < pitch) continue;
    kept.push(level);
    outer = radius;
  }
  return kept;
}
