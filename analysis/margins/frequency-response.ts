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
  const column = (read: (row: number) => number) => {
    const values = new Array<number>(count);
    for (let i = 0; i < count; i += 1) values[i] = read(i * S.ROW);
    return values;
  };
  const curve = (log: number, phase: number) => ({
    magnitude: column((row) => Math.exp(table[row + log])),
    phaseDegrees: column((row) => table[row + phase] * DEGREES),
  });
  const plant = curve(S.PLANT_LOG, S.PLANT_PHASE);
  const controller = curve(S.COMMAND_LOG, S.COMMAND_PHASE);
  const loop = curve(S.LOG, S.PHASE);
  const sensitivity = column((row) => 1 / Math.max(LEAST_DISTANCE, length(1 + table[row + S.RE], table[row + S.IM])));
  const times = (values: readonly number[]) => values.map((value, i) => value * sensitivity[i]);
  return {
    frequencies: column((row) => table[row + S.OMEGA]),
    loop: { ...loop, real: column((row) => table[row + S.RE]), imaginary: column((row) => table[row + S.IM]) },
    plant,
    controller,
    sensitivity,
    complementarySensitivity: times(loop.magnitude),
    loadSensitivity: times(plant.magnitude),
    noiseSensitivity: times(controller.magnitude),
  };
};

/** √(re² + im²), by the slow safe way only where the squares overflow. */
const length = (re: number, im: number): number => {
  const square = re * re + im * im;
  return square < Infinity ? Math.sqrt(square) : Math.hypot(re, im);
};
