/** Gains at or beyond which the loop is unstable; absent where the search found none. */
export interface StabilitySpan {
  readonly below?: number;
  readonly above?: number;
}

interface SpanSearch {
  readonly value: number;
  /** Size of a step where the gain is 0. */
  readonly size: number;
  readonly stableAt: (value: number) => boolean;
}

/** Nearly thirty times the gain, in steps that no edge of a real loop slips through between. */
const GROWTH = 1.4;
const STEPS = 10;
/** Of the edge, relative: the rule prints two figures. */
const TOLERANCE = 2e-3;
/** Of the gain itself: an edge at 0 has no relative tolerance. */
const LEAST_EDGE = 1e-3;

function* edgeBetween(stable: number, unstable: number, { value, size, stableAt }: SpanSearch): Generator<void, number> {
  const least = LEAST_EDGE * (Math.abs(value) || size);
  let [inner, outer] = [stable, unstable];
  while (Math.abs(outer - inner) > TOLERANCE * Math.max(Math.abs(inner), Math.abs(outer), least)) {
    const middle = (inner + outer) / 2;
    yield;
    if (stableAt(middle)) inner = middle;
    else outer = middle;
  }
  // Nearer to 0 than the search can tell is 0: a gain that must not change its sign.
  return Math.abs(outer) <= TOLERANCE * least ? 0 : outer;
}

/** The places to look at on one side: by a constant factor away from 0, and last 0 itself where the walk leads to it. */
function places(value: number, size: number, side: 1 | -1): number[] {
  const towardsZero = value !== 0 && Math.sign(value) !== side;
  const walk = Array.from({ length: STEPS }, (_, n) => {
    if (value === 0) return side * size * 0.01 * GROWTH ** (3 * n);
    return towardsZero ? value / GROWTH ** (n + 1) : value * GROWTH ** (n + 1);
  });
  return towardsZero ? [...walk, 0] : walk;
}

function* edgeOn(side: 1 | -1, search: SpanSearch): Generator<void, number | undefined> {
  let stable = search.value;
  for (const place of places(search.value, search.size, side)) {
    yield;
    if (!search.stableAt(place)) return yield* edgeBetween(stable, place, search);
    stable = place;
  }
  return undefined;
}

/**
 * Where, around a gain, the loop stops being stable, the others as they are. Yields after every loop that was looked at, so that
 * a page can go on between two of them. Of a loop that is not stable to begin with, nothing is said.
 */
export function* stabilitySpan(search: SpanSearch): Generator<void, StabilitySpan> {
  if (!search.stableAt(search.value)) return {};
  const below = yield* edgeOn(-1, search);
  const above = yield* edgeOn(1, search);
  return { ...(below !== undefined && { below }), ...(above !== undefined && { above }) };
}
