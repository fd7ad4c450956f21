import type { Analysis, Loop, Warning } from '@/contract';
import { buildLoop } from '@/analysis/loop/build-loop';
import { LoopError } from '@/analysis/loop/loop-error';
import type { LoopModel } from '@/analysis/loop/model';
import { fallsFrom, risesThroughHalfPower } from '@/analysis/margins/bandwidth';
import { ContinuousLoop } from '@/analysis/margins/continuous-loop';
import { gainCrossovers, phaseCrossovers } from '@/analysis/margins/crossovers';
import { limitOf, valuesAtInfinity, valuesAtZero } from '@/analysis/margins/end-values';
import { drawnGrid, frequencyResponse } from '@/analysis/margins/frequency-response';
import { decibels, delayMargin, diskMargin, gainMargin, phaseMargin, phaseMarginDegrees } from '@/analysis/margins/margins';
import { supremum, type Supremum } from '@/analysis/margins/peak';
import { Probe } from '@/analysis/margins/probe';
import * as quantities from '@/analysis/margins/quantities';
import { IM, PHASE, RE, ROW } from '@/analysis/margins/sample';
import { searchGrid, type Detail } from '@/analysis/margins/search-grid';
import { judgeStability } from '@/analysis/margins/stability';

/** Changes whenever a number of an analysis can change. */
export const engineVersion = '1.0.0';

const SINGULAR = 1e-12;
const DEGREES = 180 / Math.PI;

export interface AnalyseOptions {
  /** false: no frequency response and no series. */
  curves?: boolean;
  /** live: a coarser grid for a gain that is being moved; the same definitions. */
  detail?: Detail;
}

/**
 * Everything that can be said of one loop.
 * @throws LoopError where the loop has no meaning, is not supported, or would take too long
 */
export const analyseLoop = (input: Loop, { curves = true, detail = 'full' }: AnalyseOptions = {}): Analysis => {
  const model = buildLoop(input);
  const loop = new ContinuousLoop(model);
  refuseSingular(loop);
  const grid = searchGrid(loop, detail);
  const probe = new Probe(loop, grid.table, grid.count);
  const gain = loop.isZero ? [] : gainCrossovers(probe);
  const phase = loop.isZero ? [] : phaseCrossovers(loop, probe);
  const peaks = peaksOf(loop, probe);
  const { hidden, onBoundary, ...closedLoop } = judgeStability(model, loop, { gain, phase, modulus: 1 / peaks.ms.value });
  const warnings: Warning[] = warningsOf({ model, loop, hidden: hidden.length, onBoundary });
  const drawn = curves ? drawnGrid(loop, { crossovers: gain, detail }) : null;
  return {
    engineVersion,
    closedLoop,
    margins: {
      gain: gainMargin(phase, 'upward'),
      gainReduction: gainMargin(phase, 'downward'),
      phase: phaseMargin(gain),
      delay: delayMargin(gain, Math.abs(limitOf(loop.atInfinity.loop, 'infinity'))),
      disk: diskMargin(peaks.disk.value),
      modulus: 1 / peaks.ms.value,
      gainCrossovers: gain.map((crossover) => ({ frequency: crossover.frequency, phaseMarginDegrees: phaseMarginDegrees(crossover) })),
      phaseCrossovers: phase.map(({ frequency, gain: size }) => ({ frequency, gainMarginFactor: 1 / size })),
    },
    sensitivity: { ms: peak(peaks.ms), mt: peak(peaks.mt), noiseGain: bounded(peaks.noise) },
    bandwidth: bandwidthOf(loop, probe),
    ...(drawn ? { frequencyResponse: frequencyResponse(drawn) } : {}),
    at: exactValues(loop, input.at),
    timeResponse: null,
    warnings,
  };
};

const refuseSingular = (loop: ContinuousLoop): void => {
  const limit = limitOf(loop.atInfinity.loop, 'infinity');
  if (loop.deadTime > 0 || Math.abs(1 + limit) > SINGULAR) return;
  throw new LoopError({
    pointer: '/controller',
    detail: 'The loop has direct feedthrough of exactly −1: its signals have no finite value.',
    code: 'singularLoop',
  });
};

const peaksOf = (loop: ContinuousLoop, probe: Probe) => {
  const zero = valuesAtZero(loop);
  const infinity = valuesAtInfinity(loop);
  const of = (name: 'sensitivity' | 'complementarySensitivity' | 'balancedSensitivity' | 'noiseSensitivity') =>
    supremum(probe, quantities[name], { atZero: zero[name], atInfinity: infinity[name] });
  return { ms: of('sensitivity'), mt: of('complementarySensitivity'), disk: of('balancedSensitivity'), noise: of('noiseSensitivity') };
};

const peak = ({ value, frequency }: Supremum) => ({ value, decibels: decibels(value), frequency });

const bounded = ({ value, frequency }: Supremum) => ({ value: Number.isFinite(value) ? value : null, frequency });

const bandwidthOf = (loop: ContinuousLoop, probe: Probe): Analysis['bandwidth'] => {
  const zero = valuesAtZero(loop);
  return {
    closedLoop: fallsFrom(probe, quantities.complementarySensitivity, zero.complementarySensitivity),
    reference: fallsFrom(probe, quantities.referenceResponse, zero.referenceResponse),
    sensitivity: risesThroughHalfPower(probe, quantities.sensitivity),
  };
};

const exactValues = (loop: ContinuousLoop, frequencies: readonly number[]): Analysis['at'] => {
  const row = new Float64Array(ROW);
  return frequencies.map((frequency) => {
    loop.sampleAt(frequency, row, 0);
    return { frequency, re: row[RE], im: row[IM], phaseDegrees: row[PHASE] * DEGREES };
  });
};

const warningsOf = ({
  model,
  loop,
  hidden,
  onBoundary,
}: {
  model: LoopModel;
  loop: ContinuousLoop;
  hidden: number;
  onBoundary: boolean;
}): Warning[] => {
  const warnings: Warning[] = [];
  const say = (applies: boolean, code: string, message: string) => void (applies && warnings.push({ code, message }));
  const limit = limitOf(loop.atInfinity.loop, 'infinity');
  say(
    model.gains.kd !== 0 && model.gains.filterTime === 0,
    'improperController',
    'The derivative has no filter: the frequency response is exact, a time response cannot be given.',
  );
  say(hidden > 0, 'hiddenMode', 'A mode that does not decay is cancelled inside the loop: the loop gain hides it, the car would not.');
  say(onBoundary, 'onBoundary', 'A closed-loop pole lies on the imaginary axis: the loop is on the edge of stability.');
  say(
    loop.deadTime > 0 && limit !== 0,
    'neutralLoop',
    'With dead time and direct feedthrough the crossovers never end; the first 200 are listed.',
  );
  return warnings;
};
