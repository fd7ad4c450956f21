import type { FrequencyResponse } from '@/contract';
import { magnitude } from '@/analysis/numbers/complex';
import type { GainCrossover } from './crossovers';
import { refinedGrid, type Fineness, type Grid } from './grid';
import { ladder } from './ladder';
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
/** How near to its end a finite axis is drawn, relatively: L may be 0 there. */
const BESIDE_END = 1e-4;

/** The frequencies to draw: every corner and crossover with two decades around, the dead time's turns cut off. */
export const drawnGrid = (
  loop: LoopFunction,
  { crossovers, detail }: { crossovers: readonly GainCrossover[]; detail: 'full' | 'live' },
): Grid => {
  const fineness = detail === 'full' ? DRAWN : LIVE;
  const seen = [...loop.landmarks, ...crossovers.map(({ frequency }) => frequency)];
  const low = Math.min(...seen) / BEYOND;
  const last = crossovers.length > 0 ? crossovers[crossovers.length - 1].frequency * BEYOND_CROSSOVER : 0;
  const unbounded =
    loop.deadTime > 0 ? Math.max(Math.min(Math.max(...seen) * BEYOND, DRAWN_TURNS / loop.deadTime), last) : Math.max(...seen) * BEYOND;
  const high = loop.end === null ? unbounded : loop.end * (1 - BESIDE_END);
  const axis = new Set(loop.axisFrequencies);
  const landmarks = loop.landmarks.filter((omega) => !axis.has(omega));
  return refinedGrid(loop, ladder(low, high, { pointsPerDecade: fineness.pointsPerDecade, landmarks }), fineness);
};

/** The curves of the contract, read off a grid of exact samples. */
export const frequencyResponse = ({ table, rows }: Grid): FrequencyResponse => {
  const room = () => new Array<number>(rows.length);
  const curve = () => ({ magnitude: room(), phaseDegrees: room() });
  const response = {
    frequencies: room(),
    loop: { ...curve(), real: room(), imaginary: room() },
    plant: curve(),
    controller: curve(),
    sensitivity: room(),
    complementarySensitivity: room(),
    loadSensitivity: room(),
    noiseSensitivity: room(),
  };
  const { frequencies, loop, plant, controller } = response;
  for (let i = 0; i < rows.length; i += 1) {
    const row = rows[i];
    const sensitivity = 1 / Math.max(LEAST_DISTANCE, magnitude(1 + table[row + S.RE], table[row + S.IM]));
    frequencies[i] = table[row + S.OMEGA];
    loop.magnitude[i] = table[row + S.MAGNITUDE];
    loop.phaseDegrees[i] = table[row + S.PHASE] * DEGREES;
    loop.real[i] = table[row + S.RE];
    loop.imaginary[i] = table[row + S.IM];
    plant.magnitude[i] = table[row + S.PLANT_MAGNITUDE];
    plant.phaseDegrees[i] = table[row + S.PLANT_PHASE] * DEGREES;
    controller.magnitude[i] = table[row + S.COMMAND_MAGNITUDE];
    controller.phaseDegrees[i] = table[row + S.COMMAND_PHASE] * DEGREES;
    response.sensitivity[i] = sensitivity;
    response.complementarySensitivity[i] = table[row + S.MAGNITUDE] * sensitivity;
    response.loadSensitivity[i] = table[row + S.PLANT_MAGNITUDE] * sensitivity;
    response.noiseSensitivity[i] = table[row + S.COMMAND_MAGNITUDE] * sensitivity;
  }
  return response;
};
