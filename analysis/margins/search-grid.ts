import { ladder, refinedGrid, type Fineness, type Grid } from './grid';
import type { LoopFunction } from './loop-function';

/** Decades searched beyond the outermost landmark, at each end. */
const BEYOND = 1e4;
/** And beyond the crossing that the asymptote promises. */
const BEYOND_CROSSING = 100;
/** How near to an undamped pole or zero the search goes, relatively. */
const BESIDE_AXIS_POINT = [1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 1e-12];
/** Below this gain a dead time's crossovers are not listed, numerics.md "Margins". */
export const LEAST_LISTED_GAIN = 1e-3;

export type Detail = 'full' | 'live';

/** Coarser than a drawn grid: slopes are known at every row, so that nothing between two rows is overlooked. */
const FINENESS: Record<Detail, Fineness> = {
  full: { logStep: 0.23, phaseStep: 0.26, turnStep: 0.52, turnFloor: Math.log(LEAST_LISTED_GAIN), pointsPerDecade: 6, cap: 150_000 },
  live: { logStep: 0.6, phaseStep: 0.6, turnStep: 0.8, turnFloor: Math.log(LEAST_LISTED_GAIN), pointsPerDecade: 4, cap: 150_000 },
};

/** The whole axis, sampled finely enough that every crossing and peak lies between two rows that give it away. */
export const searchGrid = (loop: LoopFunction, detail: Detail): Grid => {
  const { low, high } = searchRange(loop);
  const fineness = FINENESS[detail];
  const beside = loop.axisFrequencies.flatMap((omega) => BESIDE_AXIS_POINT.flatMap((gap) => [omega * (1 - gap), omega * (1 + gap)]));
  const axis = new Set(loop.axisFrequencies);
  const landmarks = [...loop.landmarks.filter((omega) => !axis.has(omega)), ...beside];
  const frequencies = ladder(low, high, { pointsPerDecade: fineness.pointsPerDecade, landmarks });
  return refinedGrid(loop, frequencies, fineness);
};

const searchRange = (loop: LoopFunction): { low: number; high: number } => {
  const { landmarks } = loop;
  const first = landmarks[0];
  const last = landmarks[landmarks.length - 1];
  const early = unityOf(loop.atZero.loop);
  const late = unityOf(loop.atInfinity.loop);
  return {
    low: Math.min(first / BEYOND, early < first ? early / BEYOND_CROSSING : first),
    high: Math.max(last * BEYOND, late > last ? late * BEYOND_CROSSING : last),
  };
};

/** Where an asymptote crosses 1; NaN where it is level. */
const unityOf = ({ coefficient, power }: { coefficient: number; power: number }): number =>
  power === 0 || coefficient === 0 ? NaN : Math.abs(coefficient) ** (-1 / power);
