import type { FrequencyResponse, Loop } from '@/contract';
import { buildPlant } from '@/analysis/loop/plant';
import { UNITY } from '@/analysis/loop/rational';
import type { LoopModel } from '@/analysis/loop/model';
import { loopAt, type LoopPoint } from '@/analysis/loop-at';
import { ContinuousLoop } from '@/analysis/margins/continuous-loop';
import { drawnGrid, frequencyResponse } from '@/analysis/margins/frequency-response';

/** A plant by itself, over frequency. Magnitudes are factors, phases degrees, dead time included. */
export interface PlantResponse {
  /** Its `loop` is the plant. */
  curves: FrequencyResponse;
  /** The slowest and the fastest corner: the size of a pole or zero, or 1/dead time; 1 and 1 where there is none. rad/s */
  corners: [number, number];
  /** The exact plant at ω > 0 rad/s. */
  at: (omega: number) => Pick<LoopPoint, 'magnitude' | 'phaseDegrees'>;
}

/**
 * P(jω)·e^(−jωθ) over the frequencies where it bends, on the grid of every drawn curve.
 * @throws LoopError where the plant has no meaning
 */
export const plantResponse = (plant: Loop['plant']): PlantResponse => {
  const model = alone(plant);
  const loop = new ContinuousLoop(model);
  const { landmarks } = loop;
  return {
    curves: frequencyResponse(drawnGrid(loop, { crossovers: [], detail: 'full' })),
    corners: [landmarks[0], landmarks[landmarks.length - 1]],
    at: loopAt(model),
  };
};

/** The loop that is nothing but the plant. */
const alone = (plant: Loop['plant']): LoopModel => {
  const { rational, deadTime } = buildPlant(plant);
  return {
    plant: rational,
    plantDeadTime: deadTime,
    sensor: UNITY,
    sensorDeadTime: 0,
    controller: UNITY,
    gains: { kp: 1, ki: 0, kd: 0, filterTime: 0 },
    filters: UNITY,
    weights: { proportional: 1, derivative: 1 },
    feedforwardGain: 0,
    sampled: null,
  };
};
