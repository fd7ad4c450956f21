import type { LoopModel } from '@/analysis/loop/model';
import { ContinuousLoop } from '@/analysis/margins/continuous-loop';
import { IM, PHASE, RE, ROW } from '@/analysis/margins/sample';
import { SampledLoop } from '@/analysis/sampled/sampled-loop';
import { sampledModel } from '@/analysis/sampled/sampled-model';

/** The exact loop at one frequency, for a cursor. Magnitudes are factors. */
export interface LoopPoint {
  re: number;
  im: number;
  magnitude: number;
  phaseDegrees: number;
  sensitivity: number;
  complementarySensitivity: number;
}

/**
 * Evaluates one loop at any ω > 0 rad/s, below π/h if it is sampled: L, |S| and |T|. The loop is prepared once, so that a cursor can ask often.
 * @throws LoopError where the loop has no finite value there
 */
export const loopAt = (model: LoopModel): ((omega: number) => LoopPoint) => {
  const loop = model.sampled ? new SampledLoop(sampledModel(model, model.sampled)) : new ContinuousLoop(model);
  const row = new Float64Array(ROW);
  return (omega) => {
    loop.sampleAt(omega, row, 0);
    const magnitude = Math.hypot(row[RE], row[IM]);
    const distance = Math.hypot(1 + row[RE], row[IM]);
    return {
      re: row[RE],
      im: row[IM],
      magnitude,
      phaseDegrees: (row[PHASE] * 180) / Math.PI,
      sensitivity: 1 / distance,
      complementarySensitivity: magnitude / distance,
    };
  };
};
