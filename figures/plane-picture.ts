import type { Point, Rect } from './geometry';
import type { CircleKerb, ClosedKerb } from './kerb';
import type { CurveMark } from './curve-marks';
import type { PanelLabel } from './panel';
import type { PlacedLabel } from './place-label';
import type { Polyline } from './polyline';

/** Contours of |S| as SVG path data, by weight. `shaded` lie on each other, the highest darkest. */
export interface ContourPaths {
  readonly shaded: readonly string[];
  readonly fine: string;
  readonly strong: string;
}

export interface AxisLabel {
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly anchor: PlacedLabel['anchor'];
}

/** The point of L nearest to −1; its number is among the labels. */
export interface WorstMark {
  readonly point: Point;
  readonly summit: Point;
  /** From the point to its label; null where the label stands beside it. */
  readonly leader: readonly [Point, Point] | null;
}

/** Everything of Nyquist or Nichols that does not follow the cursor. */
export interface PlanePicture {
  readonly plot: Rect;
  readonly contours: ContourPaths;
  /** Hairlines, and the axes or reference lines over them. */
  readonly grid: string;
  readonly axes: string;
  readonly axisLabels: readonly AxisLabel[];
  /** |L| = 1, dotted; "" on Nichols, where it is a hairline. */
  readonly unitCircle: string;
  readonly kerbs: readonly ({ readonly center: Point; readonly circle: CircleKerb } | { readonly closed: ClosedKerb })[];
  /** −1 and its copies. */
  readonly summits: readonly Point[];
  readonly curves: { readonly a: string; readonly b: string; readonly others: string };
  readonly arrows: readonly CurveMark[];
  readonly posts: string;
  readonly labels: readonly PanelLabel[];
  readonly worst: WorstMark | null;
  /** A in pixels, for the pointer. */
  readonly lineA: Polyline;
  /** A loop's point in pixels. */
  readonly toPixel: (point: { re: number; im: number; magnitude: number; phaseDegrees: number }) => Point;
}
