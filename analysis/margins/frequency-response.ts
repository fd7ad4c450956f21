import type { FrequencyResponse } from '@/contract';
import type { GainCrossover } from './crossovers';
import { ladder, refinedGrid, type Fineness, type Grid } from './grid';
import type { LoopFunction } from './loop-function';
import * as S from './sample';

const DECIBELS = Math.LN10 / 20;
const DEGREES = 180 / Math.PI;

/** numerics.md "Frequency response": 0.5 dB, 5°, 4,000 points; a hair inside, so that rounding does not show. */
const DRAWN: Fineness = {
  logStep: 0.49 * DECIBELS,
  phaseStep: 4.9 / DEGREES,
  turnStep: 4.9 / DEGREES,
  quietTurnStep: 4.9 / DEGREES,
  turnFloor: -Infinity,
  pointsPerDecade: 24,
  cap: 4000,
};
/** While a gain moves: what a screen of a few hundred pixels shows. */
const LIVE: Fineness = {
  logStep: 2 * DECIBELS,
  phaseStep: 15 / DEGREES,
  turnStep: 15 / DEGREES,
  quietTurnStep: 15 / DEGREES,
  turnFloor: -Infinity,
  pointsPerDecade: 10,
  cap: 600,
};

/** A point of the grid may fall on −1 itself; JSON has no infinity. */
const LEAST_DISTANCE = 1e-15;
/** Decades drawn beyond what is worth seeing. */
const BEYOND = 100;
/** The turns of the dead time that are drawn, radians, unless a crossover lies further out. */
const DRAWN_TURNS = 60;
const BEYOND_CROSSOVER = 4;

/** The frequencies to draw: every corner and crossover with two decades around, the dead time's turns cut off. */
export const drawnGrid = (
  loop: LoopFunction,
  { crossovers, detail }: { crossovers: readonly GainCrossover[]; detail: 'full' | 'live' },
): Grid => {
  const fineness = detail === 'full' ? DRAWN : LIVE;
  const seen = [...loop.landmarks, ...crossovers.map(({ frequency }) => frequency)];
  const low = Math.min(...seen) / BEYOND;
  const last = crossovers.length > 0 ? crossovers[crossovers.length - 1].frequency * BEYOND_CROSSOVER : 0;
  const high =
    loop.deadTime > 0 ? Math.max(Math.min(Math.max(...seen) * BEYOND, DRAWN_TURNS / loop.deadTime), last) : Math.max(...seen) * BEYOND;
  const axis = new Set(loop.axisFrequencies);
  const landmarks = loop.landmarks.filter((omega) => !axis.has(omega));
  return refinedGrid(loop, ladder(low, high, { pointsPerDecade: fineness.pointsPerDecade, landmarks }), fineness);
};

/** The curves of the contract, read off a grid of exact samples. */
export const frequencyResponse = ({ table, count }: Grid): FrequencyResponse => {
  const column = (read: (row: number) => number) => Array.from({ length: count }, (_, i) => read(i * S.ROW));
  const curve = (log: number, phase: number) => ({
    magnitude: column((row) => Math.exp(table[row + log])),
    phaseDegrees: column((row) => table[row + phase] * DEGREES),
  });
  const distance = (row: number) => Math.max(LEAST_DISTANCE, Math.hypot(1 + table[row + S.RE], table[row + S.IM]));
  return {
    frequencies: column((row) => table[row + S.OMEGA]),
    loop: { ...curve(S.LOG, S.PHASE), real: column((row) => table[row + S.RE]), imaginary: column((row) => table[row + S.IM]) },
    plant: curve(S.PLANT_LOG, S.PLANT_PHASE),
    controller: curve(S.COMMAND_LOG, S.COMMAND_PHASE),
    sensitivity: column((row) => 1 / distance(row)),
    complementarySensitivity: column((row) => Math.hypot(table[row + S.RE], table[row + S.IM]) / distance(row)),
    loadSensitivity: column((row) => Math.exp(table[row + S.PLANT_LOG]) / distance(row)),
    noiseSensitivity: column((row) => Math.exp(table[row + S.COMMAND_LOG]) / distance(row)),
  };
};
