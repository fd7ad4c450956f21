import { type Point, round2 } from './geometry';

/** A point is left out where the line without it passes this near, in pixels. */
const TOLERANCE = 0.1;

const print = ({ x, y }: Point): string => `${round2(x)} ${round2(y)}`;

/** Directions from a written point in which every point left out since lies near enough to the line. Radians, about `base`. */
interface Sleeve {
  readonly base: number;
  low: number;
  high: number;
  reach: number;
}

const wrapped = (angle: number): number => angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));

function sleeveTo(from: Point, to: Point): Sleeve {
  const reach = Math.hypot(to.x - from.x, to.y - from.y);
  const half = reach > TOLERANCE ? Math.asin(TOLERANCE / reach) : Math.PI;
  return { base: Math.atan2(to.y - from.y, to.x - from.x), low: -half, high: half, reach };
}

/** Whether a line may run on to `to` past all that was left out; if so, the sleeve is narrowed by it. */
function runsOn(sleeve: Sleeve, from: Point, to: Point): boolean {
  const next = sleeveTo(from, to);
  const turn = wrapped(next.base - sleeve.base);
  if (turn < sleeve.low || turn > sleeve.high || next.reach < sleeve.reach) return false;
  sleeve.low = Math.max(sleeve.low, turn + next.low);
  sleeve.high = Math.min(sleeve.high, turn + next.high);
  sleeve.reach = next.reach;
  return true;
}

export interface PathPen {
  /** Lifts the pen and puts it down. */
  moveTo(point: Point): void;
  lineTo(point: Point): void;
  /** The path so far, with its last point. */
  path(): string;
}

/**
 * Writes SVG path data with as few points as show the curve to a tenth of a pixel: a smooth curve needs a quarter of those that it is
 * computed at.
 *
 * @see Zhao and Saalfeld, "Linear-time sleeve-fitting polyline simplification algorithms", AutoCarto 13, 1997
 */
export function createPathPen(): PathPen {
  let written = '';
  let at: Point = { x: 0, y: 0 };
  let held: Point | null = null;
  let sleeve: Sleeve | null = null;
  const write = (point: Point) => {
    written += `L${print(point)}`;
    at = point;
  };
  const finish = () => {
    if (held !== null) write(held);
    held = sleeve = null;
  };
  return {
    moveTo(point) {
      finish();
      written += `M${print(point)}`;
      at = point;
    },
    lineTo(point) {
      if (held !== null && sleeve !== null && !runsOn(sleeve, at, point)) {
        write(held);
        sleeve = null;
      }
      sleeve ??= sleeveTo(at, point);
      held = point;
    },
    path() {
      finish();
      return written;
    },
  };
}
