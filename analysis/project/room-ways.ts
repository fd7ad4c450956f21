import type { CaseResult, FirstBreak, Loop, Room } from '@/contract';
import { withLoopGain, withMoreDeadTime } from './alter-loop';

export type WayName = keyof Room;

/** One change of the loop, walked from none to as far as is looked. */
export interface Way {
  /** The amount that changes nothing. */
  readonly none: number;
  /** How far is looked where every case stays stable. */
  readonly far: (results: readonly CaseResult[]) => number;
  /** The amount at a share of the way to `reach`. */
  readonly amountAt: (share: number, reach: number) => number;
  readonly alter: (loop: Loop, amount: number) => Loop;
  /** The amount at which a stable loop loses its stability; null where none does. */
  readonly instability: (result: CaseResult) => number | null;
  /** Towards none, to what is shown. */
  readonly round: (amount: number) => number;
}

const FARTHEST_GAIN = 10;
const SHOWN_PERCENT = 100;
/** Dead time is shown in whole milliseconds, and in two figures below 10 ms. */
const SHOWN_DEAD_TIME = 1e-3;

/** Digits that arithmetic left behind the last one shown must not cost a whole step. */
const floor = (value: number) => Math.floor(value * (1 + 1e-12));
const ceil = (value: number) => Math.ceil(value * (1 - 1e-12));

function roundDeadTime(seconds: number): number {
  if (seconds <= 0) return 0;
  const step = Math.min(SHOWN_DEAD_TIME, 10 ** (Math.floor(Math.log10(seconds)) - 1));
  const perSecond = Math.round(1 / step);
  return floor(seconds * perSecond) / perSecond;
}

/** Long enough for the slowest peak to turn twice round the origin: more dead time only repeats what was seen. */
function twoTurns(results: readonly CaseResult[]): number {
  const peaks = results.flatMap(({ numbers: { sensitivity } }) => [sensitivity.ms.frequency, sensitivity.mt.frequency]);
  const slowest = Math.min(...peaks.filter((frequency) => frequency !== null && frequency > 0).map(Number));
  return Number.isFinite(slowest) ? (4 * Math.PI) / slowest : 10;
}

const alongGain = { none: 1, amountAt: (share: number, reach: number) => reach ** share, alter: withLoopGain };

export const ways: Readonly<Record<WayName, Way>> = {
  moreGain: {
    ...alongGain,
    far: () => FARTHEST_GAIN,
    instability: ({ numbers }) => numbers.margins.gain?.factor ?? null,
    round: (factor) => floor(factor * SHOWN_PERCENT) / SHOWN_PERCENT,
  },
  lessGain: {
    ...alongGain,
    far: () => 1 / FARTHEST_GAIN,
    instability: ({ numbers }) => numbers.margins.gainReduction?.factor ?? null,
    round: (factor) => ceil(factor * SHOWN_PERCENT) / SHOWN_PERCENT,
  },
  moreDeadTime: {
    none: 0,
    far: twoTurns,
    amountAt: (share, reach) => share * reach,
    alter: withMoreDeadTime,
    instability: ({ numbers }) => numbers.margins.delay?.seconds ?? null,
    round: roundDeadTime,
  },
};

/** Which of two is nearer to no change at all. */
const nearer = (none: number, a: number, b: number) => Math.abs(a - none) < Math.abs(b - none);

/** Where the first case loses its stability, exactly, from its own margins. */
export function firstInstability({ none, instability }: Way, results: readonly CaseResult[]): FirstBreak | null {
  return results.reduce<FirstBreak | null>((first, result) => {
    const amount = result.numbers.closedLoop.stable ? instability(result) : none;
    if (amount === null || (first && !nearer(none, amount, first.amount))) return first;
    return { amount, quantity: null, limit: null, case: result.case };
  }, null);
}

/** The earlier of two, the first where they are equal. */
export const firstOf = (none: number, a: FirstBreak | null, b: FirstBreak | null): FirstBreak | null =>
  b && (!a || nearer(none, b.amount, a.amount)) ? b : a;
