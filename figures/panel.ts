import type { Point, Rect } from './geometry';
import type { StraightKerb } from './kerb';
import type { Axis } from './linear-axis';
import type { PlacedLabel } from './place-label';

/** How a label is said: a number of the loop, a quiet name, a limit, a number of B, a number without meaning (struck out), or the height of a contour. */
export type LabelTone = 'strong' | 'quiet' | 'limit' | 'b' | 'struck' | 'contour';

export interface PanelLabel {
  readonly lines: readonly string[];
  readonly place: PlacedLabel;
  readonly tone: LabelTone;
}

/** SVG path data of a panel's curves; "" where there is none. */
export interface PanelCurves {
  readonly a: string;
  readonly b: string;
  /** The panel's second quantity, drawn thinner. */
  readonly secondA: string;
  readonly secondB: string;
  readonly others: string;
}

/** One panel of a stack: everything about it that does not follow the cursor. */
export interface PanelPicture {
  readonly title: string;
  readonly unit: string;
  readonly plot: Rect;
  readonly axis: Axis;
  /** Values of the reference lines. */
  readonly strong: readonly number[];
  readonly curves: PanelCurves;
  readonly kerbs: readonly StraightKerb[];
  /** Upright bars from a reference to a curve; the disc stands at `to`. */
  readonly bars: readonly { readonly x: number; readonly from: number; readonly to: number; readonly disc: boolean }[];
  /** The worst point and lesser ones. */
  readonly dots: readonly (Point & { readonly radius: number })[];
  readonly labels: readonly PanelLabel[];
}

/** Where the panels of a stack stand: one under the other, sharing the axis at the foot. */
export interface StackLayout {
  readonly width: number;
  readonly height: number;
  readonly plots: readonly Rect[];
  readonly foot: number;
}

export const stackMargins = { left: 44, right: 10, top: 18, gap: 24, foot: 28 } as const;

/** Divides a height among panels by weight. */
export function stackLayout(width: number, height: number, weights: readonly number[]): StackLayout {
  const { left, right, top, gap, foot } = stackMargins;
  const free = height - top - foot - gap * (weights.length - 1);
  const sum = weights.reduce((total, weight) => total + weight, 0);
  let y: number = top;
  const plots = weights.map((weight) => {
    const plot = { x: left, y, width: Math.max(1, width - left - right), height: Math.max(1, (free * weight) / sum) };
    y += plot.height + gap;
    return plot;
  });
  return { width, height, plots, foot: height - foot };
}
