import { analyseLoop, buildLoop, loopAt } from '@/analysis';
import { Loop, type LoopInput } from '@/contract';
import type { ChartDesign } from '@/figures';

type Gains = { kp: number; ki: number; kd: number; derivativeFilterTime?: number };
type Plant = { numerator: number[]; denominator: number[]; deadTime?: number };

/** A design as the charts take it, analysed by the engine itself. */
export function chartDesign(label: string, plant: Plant, gains: Gains): ChartDesign {
  const input: LoopInput = {
    plant: { kind: 'coefficients', ...plant },
    controller: { form: 'parallel', derivativeFilterTime: 0, ...gains },
  };
  const loop = Loop.parse(input);
  const model = buildLoop(loop);
  return { label, analysis: analyseLoop(loop), at: loopAt(model) };
}

/** An integrating plant with a lag and dead time; stable. */
export const integrating = (label = 'A, now', kp = 1.2): ChartDesign =>
  chartDesign(label, { numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 }, { kp, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 });

/** Needs one anticlockwise turn round −1. */
export const unstablePlant = (): ChartDesign =>
  chartDesign('A, now', { numerator: [2], denominator: [1, -1], deadTime: 0.05 }, { kp: 2, ki: 0.5, kd: 0 });

export const hugeGain = (): ChartDesign =>
  chartDesign('A, now', { numerator: [1e6], denominator: [1, 200, 1e4] }, { kp: 10, ki: 1000, kd: 0 });

/** |L| stays under 1 everywhere. */
export const neverCrosses = (): ChartDesign => chartDesign('A, now', { numerator: [0.5], denominator: [1, 1] }, { kp: 1, ki: 0, kd: 0 });

/** Past its gain margin. */
export const unstableLoop = (): ChartDesign => integrating('A, now', 30);
