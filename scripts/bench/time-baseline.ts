import type { LoopModel } from '@/analysis';
import { exponential } from '@/analysis/numbers/matrix-exponential';
import { linearLoop } from '@/analysis/time/linear-loop';
import type { TimeSeries } from '@/contract';

/**
 * The least that any program does for the two step responses: the state stepped evenly with a matrix made beforehand, as many
 * steps as the analysis returned points, output and control read from each state into arrays made beforehand.
 *
 * @param model without dead time
 * @returns what does it once; its number only keeps the work from being left out
 */
export function timeBaseline(model: LoopModel, responses: readonly TimeSeries[]): () => number {
  const system = linearLoop(model);
  if (!system) throw new Error('The loop has no state equations.');
  const runs = responses.map(({ time }, k) => {
    const step = time[time.length - 1] / (time.length - 1);
    const { dynamics } = system;
    return {
      flow: exponential({ ...dynamics, data: dynamics.data.map((value) => value * step) }).data,
      initial: k === 0 ? system.initial(1, 0) : system.initial(0, 1),
      output: new Float64Array(time.length),
      control: new Float64Array(time.length),
    };
  });
  const order = system.dynamics.rows;
  const state = new Float64Array(order);
  const next = new Float64Array(order);
  const { output: outputRow, control: controlRow } = system.rows;
  return () => {
    for (const { flow, initial, output, control } of runs) {
      state.set(initial);
      for (let k = 0; k < output.length; k += 1) {
        let [y, u] = [0, 0];
        for (let i = 0; i < order; i += 1) {
          y += outputRow[i] * state[i];
          u += controlRow[i] * state[i];
          let sum = 0;
          for (let j = 0; j < order; j += 1) sum += flow[i * order + j] * state[j];
          next[i] = sum;
        }
        output[k] = y;
        control[k] = u;
        state.set(next);
      }
    }
    return runs.length > 0 ? runs[0].output[runs[0].output.length - 1] : 0;
  };
}
