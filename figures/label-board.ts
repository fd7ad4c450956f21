import type { Rect } from './geometry';
import type { LabelTone, PanelLabel } from './panel';
import { type Polyline, thinned } from './polyline';
import { type LabelPlace, type Paper, type PlacedLabel, placeLabel } from './place-label';

export interface LabelBoard {
  readonly labels: PanelLabel[];
  /** Puts a label in the freest of its places, and keeps that place from those that follow. */
  add(lines: readonly string[], tone: LabelTone, places: readonly LabelPlace[]): PlacedLabel;
  /** Keeps labels off something that is drawn. */
  reserve(rect: Rect): void;
}

/** One picture's labels, placed one after the other so that none covers another. */
export function createLabelBoard({ bounds, curves, faint = [], shaded }: Omit<Paper, 'taken'>): LabelBoard {
  const thin = (line: Polyline) => thinned(line, bounds);
  const paper = { bounds, curves: curves.map(thin), faint: faint.map(thin), shaded };
  const labels: PanelLabel[] = [];
  const taken: Rect[] = [];
  return {
    labels,
    add(lines, tone, places) {
      const place = placeLabel(lines, places, { ...paper, taken });
      taken.push(place.box);
      labels.push({ lines, tone, place });
      return place;
    },
    reserve(rect) {
      taken.push(rect);
    },
  };
}

/** Places beside an upright bar, at some heights: close to it, then further off, past a short kerb across it. */
export function placesBeside(x: number, heights: readonly number[], distances: readonly number[] = [8, 24]): LabelPlace[] {
  return distances.flatMap((away) =>
    heights.flatMap((y) => [
      { x: x - away, y, anchor: 'end' as const },
      { x: x + away, y, anchor: 'start' as const },
    ]),
  );
}

export const boxAround = (x: number, y: number, radius: number): Rect => ({
  x: x - radius,
  y: y - radius,
  width: 2 * radius,
  height: 2 * radius,
});
