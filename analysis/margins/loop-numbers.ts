import type { Analysis } from '@/contract';
import { fallsFrom, risesThroughHalfPower } from './bandwidth';
import { gainCrossovers, phaseCrossovers } from './crossovers';
import type { GainPassages } from './encirclements';
import { limitOf, valuesAtInfinity, valuesAtZero } from './end-values';
import type { LoopFunction } from './loop-function';
import { decibels, delayMargin, diskMargin, gainMargin, phaseMargin, phaseMarginDegrees } from './margins';
import { supremum, type Supremum } from './peak';
import { Probe } from './probe';
import { balancedSensitivity, complementarySensitivity, loopGain, noiseSensitivity, referenceResponse, sensitivity } from './quantities';
import { searchGrid, type Detail } from './search-grid';

/** Everything that is read off the frequency axis, each number refined on the exact function. */
export type LoopNumbers = Pick<Analysis, 'margins' | 'sensitivity' | 'bandwidth'> & GainPassages;

/** A peak beyond this is a pole on the axis as far as double precision can tell; JSON has no infinity, and no decibels of 0. */
const HIGHEST_PEAK = 1e15;

const PEAKING = { sensitivity, complementarySensitivity, balancedSensitivity, noiseSensitivity };

/** Margins, peaks and bandwidths of a loop. @throws LoopError where the loop turns through too many crossovers */
export const loopNumbers = (loop: LoopFunction, detail: Detail): LoopNumbers => {
  const grid = searchGrid(loop, detail);
  const probe = new Probe(loop, grid);
  const crossovers = loop.isZero ? [] : gainCrossovers(probe);
  const phase = loop.isZero ? [] : phaseCrossovers(loop, probe);
  const zero = valuesAtZero(loop);
  const infinity = valuesAtInfinity(loop);
  const peak = (name: keyof typeof PEAKING) => supremum(probe, PEAKING[name], { atZero: zero[name], atEnd: infinity[name], end: loop.end });
  const ms = reported(peak('sensitivity'));
  const noise = peak('noiseSensitivity');
  return {
    crossovers,
    startsOutside: probe.valueAt(0, loopGain) > 0,
    margins: {
      gain: gainMargin(phase, 'upward'),
      gainReduction: gainMargin(phase, 'downward'),
      phase: phaseMargin(crossovers),
      delay: delayMargin(crossovers, Math.abs(limitOf(loop.atInfinity.loop, 'infinity'))),
      disk: diskMargin(peak('balancedSensitivity').value),
      modulus: 1 / ms.value,
      gainCrossovers: crossovers.map((crossover) => ({
        frequency: crossover.frequency,
        phaseMarginDegrees: phaseMarginDegrees(crossover),
      })),
      phaseCrossovers: phase.map(({ frequency, gain }) => ({ frequency, gainMarginFactor: 1 / gain })),
    },
    sensitivity: {
      ms,
      mt: reported(peak('complementarySensitivity')),
      noiseGain: { value: Number.isFinite(noise.value) ? noise.value : null, frequency: noise.frequency },
    },
    bandwidth: {
      closedLoop: fallsFrom(probe, complementarySensitivity, zero.complementarySensitivity),
      reference: fallsFrom(probe, referenceResponse, zero.referenceResponse),
      sensitivity: risesThroughHalfPower(probe, sensitivity),
    },
  };
};

const reported = ({ value, frequency }: Supremum) => {
  const finite = Math.min(value, HIGHEST_PEAK);
  return { value: finite, decibels: decibels(Math.max(finite, 1 / HIGHEST_PEAK)), frequency };
};
