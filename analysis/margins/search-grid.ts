import { LoopError } from '@/analysis/loop/loop-error';
import { refinedGrid, type Fineness, type Grid } from './grid';
import { ladder } from './ladder';
import { LEAST_LISTED_GAIN } from './least-gain';
import type { LoopFunction } from './loop-function';

/** Decades searched beyond the outermost landmark, at each end. */
const BEYOND = 1e4;
/** And beyond the crossing that the asymptote promises. */
const BEYOND_CROSSING = 100;
/** A neutral loop goes round for ever; it is followed past its last landmark and for the crossovers that are listed. */
const NEUTRAL_BEYOND = 10;
const NEUTRAL_TURNS = 205;
/** How near to an undamped pole or zero the search goes, relatively. */
const BESIDE_AXIS_POINT = [1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 1e-12];
/** How near to its end a finite axis is searched, relatively; what L comes to there is known by itself. */
const BESIDE_END = 1e-6;

/** Beyond this ratio of the fastest to the slowest motion a frequency's powers leave the range of numbers. */
const WIDEST_SPAN = 1e150;

/** Rows beyond which a loop is refused rather than waited for: about 10,000 turns of dead time. */
const CAP = 60_000;

export type Detail = 'full' | 'live';

/** Coarser than a drawn grid: slopes are known at every row, so that nothing between two rows is overlooked. */
const FINENESS: Record<Detail, Fineness> = {
  full: {
    logStep: 0.23,
    phaseStep: 0.26,
    turnStep: 0.52,
    quietTurnStep: 1.2,
    turnFloor: Math.log(LEAST_LISTED_GAIN),
    pointsPerDecade: 6,
    cap: CAP,
  },
  live: {
    logStep: 0.6,
    phaseStep: 0.6,
    turnStep: 0.8,
    quietTurnStep: 1.2,
    turnFloor: Math.log(LEAST_LISTED_GAIN),
    pointsPerDecade: 4,
    cap: CAP,
  },
};

/**
 * The whole axis, sampled finely enough that every crossing and peak lies between two rows that give it away.
 * @throws LoopError where the dead time turns the loop through more crossovers than can be worked through, or its motions are too far apart
 */
export const searchGrid = (loop: LoopFunction, detail: Detail): Grid => {
  const { low, high } = searchRange(loop);
  if (!(low > 0 && high / low <= WIDEST_SPAN)) throw tooFarApart();
  const fineness = FINENESS[detail];
  const beside = loop.axisFrequencies.flatMap((omega) => BESIDE_AXIS_POINT.flatMap((gap) => [omega * (1 - gap), omega * (1 + gap)]));
  const axis = new Set(loop.axisFrequencies);
  const landmarks = [...loop.landmarks.filter((omega) => !axis.has(omega)), ...beside].sort((a, b) => a - b);
  const frequencies = ladder(low, high, { pointsPerDecade: fineness.pointsPerDecade, landmarks });
  const grid = refinedGrid(loop, frequencies, fineness);
  if (grid.capped) throw tooManyTurns();
  return grid;
};

const searchRange = (loop: LoopFunction): { low: number; high: number } => {
  const { landmarks } = loop;
  const first = landmarks[0];
  const last = landmarks[landmarks.length - 1];
  const early = unityOf(loop.atZero.loop);
  const late = unityOf(loop.atInfinity.loop);
  const low = Math.min(first / BEYOND, early < first ? early / BEYOND_CROSSING : first);
  if (loop.end !== null) return { low, high: loop.end * (1 - BESIDE_END) };
  const isNeutral = loop.deadTime > 0 && loop.atInfinity.loop.power >= 0;
  if (isNeutral) return { low, high: last * NEUTRAL_BEYOND + (NEUTRAL_TURNS * 2 * Math.PI) / loop.deadTime };
  return { low, high: Math.max(last * BEYOND, late > last ? late * BEYOND_CROSSING : last) };
};

/** Where an asymptote crosses 1; NaN where it is level. */
const unityOf = ({ coefficient, power }: { coefficient: number; power: number }): number =>
  power === 0 || coefficient === 0 ? NaN : Math.abs(coefficient) ** (-1 / power);

const tooManyTurns = () =>
  new LoopError({
    pointer: '/plant/deadTime',
    detail: 'This loop turns through too many crossovers to analyse: its dead time is very long beside its fastest motion.',
    code: 'tooMuchToCompute',
  });

const tooFarApart = () =>
  new LoopError({
    pointer: '/plant',
    detail: 'The fastest and the slowest motion of this loop are too far apart: a coefficient or a time is all but zero beside the others.',
    code: 'outOfRange',
  });
