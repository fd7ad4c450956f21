import type { CaseResult, DesignContent, FirstBreak, FrozenCase, Limit, Loop, Room, RoomWay } from '@/contract';
import { breachIn, breachOf } from './breach';
import { caseLoop } from './case-loop';
import { firstBreak } from './first-break';
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

/** A hair beyond the margin that ends the walk, so that the loop is not stable there and not merely at the edge of it. */
const BEYOND = 1e-6;

const worstUse = ({ checks }: CaseResult) =>
  Math.max(...checks.map(({ use, verdict }) => (verdict === 'fail' ? Infinity : (use ?? -Infinity))));

/** How far is looked: to where the first case loses its stability, since a limit breaks there at the latest. */
export function reachOf(name: WayName, results: readonly CaseResult[]): number {
  const way = ways[name];
  const far = way.far(results);
  const ends = firstInstability(way, results)?.amount ?? far;
  return Math.abs(ends - way.none) < Math.abs(far - way.none) ? ends : far;
}

/** A loop that is not stable breaks every limit. */
const withinReach = ({ none }: Way, reach: number, first: FirstBreak | null) =>
  first && Math.abs(first.amount - none) <= Math.abs(reach - none) ? first : null;

const beyond = ({ none }: Way, reach: number) => reach + (reach - none) * BEYOND;

/**
 * Where the first of these limits breaks in any of the cases along one way, not yet rounded.
 *
 * @returns null where none of them does
 */
function firstLimitToBreak(name: WayName, { design, cases, limits, results }: RoomQuestion, { reach, asked }: Search): FirstBreak | null {
  if (limits.length === 0) return null;
  const way = ways[name];
  const end = beyond(way, reach);
  const candidates = results
    .map((result, index): Candidate => ({ result, loop: caseLoop(cases[index], design) }))
    .sort((a, b) => worstUse(b.result) - worstUse(a.result) || 0);
  const found = firstBreak(candidates, ({ result, loop }, share) => {
    if (share === 0) return breachIn(limits, result.numbers);
    asked?.();
    return breachOf(way.alter(loop, way.amountAt(share, end)), limits);
  });
  const limit = found && { amount: way.amountAt(found.holds, end), ...found.what, case: found.case.result.case };
  return firstOf(way.none, limit, withinReach(way, reach, firstInstability(way, results)));
}

/** Both kinds of limits that are asked about: all of them, and those on stability quantities alone. */
const limitKinds = (limits: readonly Limit[]) => ({
  any: limits,
  stability: limits.filter(({ quantity }) => quantities[quantity].stability),
});

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

/** What one way breaks in these cases: every limit asked about, then those on stability quantities alone. */
export function roomAlong(name: WayName, question: RoomQuestion, search: Search): FoundRoom {
  const { any, stability } = limitKinds(question.limits);
  const first = firstLimitToBreak(name, question, search);
  const same = stability.length === any.length;
  return { any: first, stability: same ? first : firstLimitToBreak(name, { ...question, limits: stability }, search) };
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
