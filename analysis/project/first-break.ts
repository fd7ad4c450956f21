/** Where something gives way first, as shares of the way that is walked. */
export interface Break<Case, What> {
  /** Everything holds here … */
  readonly holds: number;
  /** … and no longer here. Equal to `holds` only where it gives way at the start. */
  readonly breaks: number;
  readonly case: Case;
  readonly what: What;
}

type BreakAt<Case, What> = (one: Case, share: number) => What | null;

const STEPS = 11;
const STEP_RATIO = 1.5;
/** Shares of the way, near steps close together: 1.7 %, 2.6 %, … 67 %, all. */
const steps = Array.from({ length: STEPS }, (_, k) => STEP_RATIO ** (k + 1 - STEPS));

const NARROW_ENOUGH = { relative: 5e-4, absolute: 1e-6 };
const isNarrow = (holds: number, breaks: number) => breaks - holds <= Math.max(NARROW_ENOUGH.relative * breaks, NARROW_ENOUGH.absolute);

/** Halves the stretch in which one case gives way until it is narrow, always on the exact judgement. */
function bracket<Case, What>(found: Break<Case, What>, breakAt: BreakAt<Case, What>): Break<Case, What> {
  let { holds, breaks, what } = found;
  while (!isNarrow(holds, breaks)) {
    const middle = (holds + breaks) / 2;
    const there = breakAt(found.case, middle);
    if (there === null) holds = middle;
    else [breaks, what] = [middle, there];
  }
  return { ...found, holds, breaks, what };
}

/** Walks outward in growing steps until a case gives way or the end is reached. */
function walk<Case, What>(one: Case, breakAt: BreakAt<Case, What>): Break<Case, What> | null {
  let holds = 0;
  for (const share of steps) {
    const what = breakAt(one, share);
    if (what !== null) return bracket({ holds, breaks: share, case: one, what }, breakAt);
    holds = share;
  }
  return null;
}

/** Where one of these cases gives way before the end of the walk, which nothing else has until there. */
function atTheEnd<Case, What>(cases: readonly Case[], breakAt: BreakAt<Case, What>): Break<Case, What> | null {
  for (const one of cases) {
    const what = breakAt(one, 1);
    if (what !== null) return bracket({ holds: 0, breaks: 1, case: one, what }, breakAt);
  }
  return null;
}

/**
 * Whichever gives way before the first that is known. Of those that do, the middle one is bracketed next and the others are
 * asked again: in whatever order they stand, each round leaves about half of them.
 */
function soonest<Case, What>(suspects: readonly Case[], known: Break<Case, What>, breakAt: BreakAt<Case, What>): Break<Case, What> {
  let first = known;
  let left = suspects;
  for (;;) {
    const { holds } = first;
    const sooner = left.flatMap((one) => {
      const what = breakAt(one, holds);
      return what === null ? [] : [{ holds: 0, breaks: holds, case: one, what }];
    });
    if (sooner.length === 0) return first;
    const [next] = sooner.splice(sooner.length >> 1, 1);
    first = bracket(next, breakAt);
    left = sooner.map((other) => other.case);
  }
}

/**
 * The first thing to give way in any case along one change of the loop, a gain that is turned or a dead time that grows.
 *
 * A first case is walked outward in steps that grow by half and bracketed by halving, on the exact judgement. Every other is
 * asked only where everything known so far still holds, at the latest at the end of the walk, and bracketed only if it gives way there. What gives way and holds
 * again between two steps, or before that place, is passed over.
 *
 * @param cases the likeliest to give way first
 * @param breakAt what gives way in a case at a share of the way from 0, now, to 1; null where everything holds
 * @param known something that gives way there already: only what comes before it is looked for
 * @returns bracketed to 5e-4 of the share, or to 1e-6; null where nothing gives way within the walk
 * @see REFERENCES.md "Room and marks"
 */
export function firstBreak<Case, What>(
  cases: readonly Case[],
  breakAt: BreakAt<Case, What>,
  known: Break<Case, What> | null = null,
): Break<Case, What> | null {
  for (const one of cases) {
    const now = breakAt(one, 0);
    if (now !== null) return { holds: 0, breaks: 0, case: one, what: now };
  }
  if (known) return soonest(cases, known, breakAt);
  const [nearest, ...others] = cases;
  const first = (nearest !== undefined && walk(nearest, breakAt)) || atTheEnd(others, breakAt);
  return (
    first &&
    soonest(
      others.filter((one) => one !== first.case),
      first,
      breakAt,
    )
  );
}
