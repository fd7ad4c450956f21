import type { CaseResult, DesignContent, FirstBreak, FrozenCase, Limit, Loop, Room, RoomWay } from '@/contract';
import { breachIn, breachOf, type Breach } from './breach';
import { caseLoop } from './case-loop';
import { firstBreak, type Break } from './first-break';
import { quantities } from './quantities';
import { firstInstability, firstOf, ways, type Way, type WayName } from './room-ways';

/** A design over cases, judged as it is now. */
export interface RoomQuestion {
  readonly design: DesignContent;
  readonly cases: readonly FrozenCase[];
  readonly limits: readonly Limit[];
  /** Of the cases, in the same order. */
  readonly results: readonly CaseResult[];
}

interface Search {
  /** How far is looked. */
  readonly reach: number;
  /** Hears of every loop that is analysed on the way, before it is. */
  readonly asked?: () => void;
}

interface Candidate {
  readonly result: CaseResult;
  readonly loop: Loop;
}

type FoundBreak = Break<Candidate, Breach>;

/** A hair beyond the margin that ends the walk, so that the loop is not stable there and not merely at the edge of it. */
const BEYOND = 1e-6;

const worstUse = ({ checks }: CaseResult, limits: readonly Limit[]) =>
  Math.max(
    ...checks
      .filter(({ quantity, bound }) => limits.some((limit) => limit.quantity === quantity && limit.bound === bound))
      .map(({ use, verdict }) => (verdict === 'fail' ? Infinity : (use ?? -Infinity))),
  );

const distance = ({ none }: Way, amount: number) => Math.abs(amount - none);

/** How far is looked: to where the first case loses its stability, since a limit breaks there at the latest. */
export function reachOf(name: WayName, results: readonly CaseResult[]): number {
  const way = ways[name];
  const far = way.far(results);
  const ends = firstInstability(way, results)?.amount ?? far;
  return distance(way, ends) < distance(way, far) ? ends : far;
}

/** One way, walked over the cases of a question. */
class RoomWalk {
  private readonly way: Way;
  private readonly end: number;
  private readonly candidates: readonly Candidate[];

  constructor(
    name: WayName,
    { design, cases, results }: RoomQuestion,
    private readonly search: Search,
  ) {
    this.way = ways[name];
    this.end = search.reach + (search.reach - this.way.none) * BEYOND;
    this.candidates = results.map((result, index) => ({ result, loop: caseLoop(cases[index], design) }));
  }

  /** Where the first of these limits breaks before what is `known` to break. */
  first(limits: readonly Limit[], known: FoundBreak | null): FoundBreak | null {
    if (limits.length === 0) return known;
    const worstFirst = [...this.candidates].sort((a, b) => worstUse(b.result, limits) - worstUse(a.result, limits) || 0);
    const breakAt = ({ result, loop }: Candidate, share: number) => {
      if (share === 0) return breachIn(limits, result.numbers);
      this.search.asked?.();
      return breachOf(this.way.alter(loop, this.way.amountAt(share, this.end)), limits);
    };
    return firstBreak(worstFirst, breakAt, known);
  }

  /** As it is told. A loop that is not stable breaks every limit, so nothing holds beyond the first instability. */
  told(found: FoundBreak | null): FirstBreak | null {
    const limit = found && { amount: this.way.amountAt(found.holds, this.end), ...found.what, case: found.case.result.case };
    const instability = firstInstability(
      this.way,
      this.candidates.map(({ result }) => result),
    );
    const within = instability && distance(this.way, instability.amount) <= distance(this.way, this.search.reach);
    return firstOf(this.way.none, limit, within ? instability : null);
  }
}

/** The first limits to break along one way in some of the cases, not yet rounded. */
export type FoundRoom = Pick<RoomWay, 'any' | 'stability'>;

/** Puts together what was found along one way, rounded to what is shown. @param found in parts of the cases, in any order */
export function roomWay(name: WayName, results: readonly CaseResult[], found: readonly FoundRoom[]): RoomWay {
  const way = ways[name];
  const rounded = (first: FirstBreak | null) => first && { ...first, amount: way.round(first.amount) };
  const earliest = (kind: keyof FoundRoom) =>
    rounded(found.reduce<FirstBreak | null>((first, part) => firstOf(way.none, first, part[kind]), null));
  return {
    lookedTo: way.round(reachOf(name, results)),
    any: earliest('any'),
    stability: earliest('stability'),
    instability: rounded(firstInstability(way, results)),
  };
}

/**
 * What one way breaks in some of the cases. Limits on stability quantities come first: they are judged on margins alone, and
 * the others, some of which need a time response, are then asked only where those still hold.
 */
export function roomAlong(name: WayName, question: RoomQuestion, search: Search): FoundRoom {
  const walk = new RoomWalk(name, question, search);
  const isStability = ({ quantity }: Limit) => quantities[quantity].stability;
  const [stable, other] = [question.limits.filter(isStability), question.limits.filter((limit) => !isStability(limit))];
  const stability = walk.first(stable, null);
  const any = walk.first(other, stability);
  return { any: question.limits.length > 0 ? walk.told(any) : null, stability: stable.length > 0 ? walk.told(stability) : null };
}

export const wayNames = Object.keys(ways) as WayName[];

/**
 * How much more gain, less gain and more dead time the car may bring, one at a time, before the first limit breaks in any case,
 * which limit and in which case; the same for stability limits alone and for stability itself. Rounded down, never up.
 *
 * @see numerics.md "Room", REFERENCES.md "Room and marks"
 * @throws LoopError as analyseLoop does
 */
export function room(question: RoomQuestion): Room {
  const along = (name: WayName) => roomWay(name, question.results, [roomAlong(name, question, { reach: reachOf(name, question.results) })]);
  return { moreGain: along('moreGain'), lessGain: along('lessGain'), moreDeadTime: along('moreDeadTime') };
}
