import type { Verdict } from '@/contract';

/**
 * One corner seen from above, its edge on the right, in a box of 20: open; inked along the edge; solid with the kerb bitten into it.
 * What nobody judged is a dashed ring.
 */
export interface VerdictShape {
  /** Outlined, not filled. */
  readonly outline: string | null;
  readonly solid: string | null;
  /** Radius and dash of the ring, where that is the shape. */
  readonly ring: { readonly radius: number; readonly dash: readonly [number, number] } | null;
}

const corner = 'M2 18C2 9 9 2 18 2v16z';
const RING_RADIUS = 8;
const RING_DASHES = 8;
const ringPitch = (2 * Math.PI * RING_RADIUS) / RING_DASHES;

export const verdictShapes: Record<Verdict, VerdictShape> = {
  pass: { outline: corner, solid: null, ring: null },
  tight: { outline: corner, solid: 'M9.5 18V5C12 3 15 2 18 2v16z', ring: null },
  fail: { outline: null, solid: 'M.8 19.2C.8 9 9 .8 19.2 .8v3.2h-3.6v4h3.6v3.8h-3.6v4h3.6v3.4z', ring: null },
  notJudged: { outline: null, solid: null, ring: { radius: RING_RADIUS, dash: [ringPitch / 2, ringPitch / 2] } },
};

export const verdictWords: Record<Verdict, string> = { pass: 'pass', tight: 'tight', fail: 'fail', notJudged: 'not judged' };
