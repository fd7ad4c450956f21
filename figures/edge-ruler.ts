import { clamp } from './geometry';
import { straightKerb, type StraightKerb } from './kerb';

/** The one scale of every edge ruler: use 0 is the target, 1 the limit. */
export const rulerScale = { low: -6, high: 1.6 } as const;

export interface EdgeRulerInput {
  width: number;
  height: number;
  /** use of every case. */
  uses: readonly number[];
  worst: number | null;
  hasTarget: boolean;
  ghost?: number | null;
  /** Room for names under the line. */
  named: boolean;
}

export interface EdgeRulerShape {
  readonly baseline: { readonly y: number; readonly from: number; readonly to: number };
  readonly target: number;
  readonly limit: number;
  readonly kerb: StraightKerb;
  readonly ticks: readonly number[];
  readonly needle: number | null;
  readonly ghost: number | null;
  /** Cases more comfortable than the ruler reaches. */
  readonly offLeft: boolean;
  /** Cases further past the limit than the ruler reaches. */
  readonly offRight: boolean;
  readonly hasTarget: boolean;
}

const LEFT = 14;
const RIGHT = 8;
/** At least one red and one white, or it would not read as a kerb. */
const BLOCK = 8;

/** All cases against one target and limit; the edge is always on the right. */
export function edgeRuler({ width, height, uses, worst, hasTarget, ghost = null, named }: EdgeRulerInput): EdgeRulerShape {
  const { low, high } = rulerScale;
  const at = (use: number) => LEFT + ((clamp(use, low, high) - low) / (high - low)) * (width - LEFT - RIGHT);
  const y = height - (named ? 25 : 9);
  const limit = at(1);
  const end = width - RIGHT;
  return {
    baseline: { y, from: LEFT, to: limit },
    target: at(0),
    limit,
    kerb: straightKerb({
      from: { x: limit, y },
      to: { x: end, y },
      thickness: 7,
      block: Math.min(BLOCK, (end - limit) / 2),
      side: 'right',
    }),
    ticks: uses.filter((use) => use >= low && use <= high).map(at),
    needle: worst === null ? null : at(worst),
    ghost: ghost === null ? null : at(ghost),
    offLeft: uses.some((use) => use < low),
    offRight: uses.some((use) => use > high),
    hasTarget,
  };
}
