import { describe, expect, it } from 'vitest';
import { buildLoop, differenceEquation } from '@/analysis';
import { ControllerRun } from '@/analysis/sampled/controller-run';
import { respondSampled } from '@/analysis/sampled/sampled-responses';
import { Loop, type LoopInput } from '@/contract';

/** Every delay is a whole number of these steps, so that each step's input stands still. */
const STEP = 1e-3;
const [PERIOD, DEAD_TIME, SENSOR_DELAY, COMPUTATION] = [100, 34, 13, 147];
const SENSOR_LAG = 0.06;
const DURATION = 3000;

const input = Loop.parse({
  plant: { kind: 'coefficients', numerator: [8], denominator: [1, 2, 4], deadTime: DEAD_TIME * STEP },
  sensor: { timeConstant: SENSOR_LAG, deadTime: SENSOR_DELAY * STEP },
  controller: {
    form: 'parallel',
    kp: 0.3,
    ki: 0.5,
    kd: 0.05,
    derivativeFilterTime: 0.08,
    setpointWeights: { proportional: 0.6, derivative: 0.2 },
    feedforward: { gain: 0.1 },
    filters: [{ kind: 'lowPass', timeConstant: 0.05 }],
  },
  sampling: { period: PERIOD * STEP, integral: 'trapezoidal', derivative: 'backward', computationDelay: COMPUTATION * STEP },
} satisfies LoopInput);

/** The loop step by step by Runge and Kutta's rule: a clock, three delay lines, and the difference equation at each sample. */
const integrated = (reference: number, load: number): number[] => {
  const controller = new ControllerRun(differenceEquation(input.controller, input.sampling!));
  const slope = ([y, v, m]: number[], u: number) => [v, 8 * u - 2 * v - 4 * y, (y - m) / SENSOR_LAG];
  const moved = (from: number[], by: number[], share: number) => from.map((x, i) => x + share * STEP * by[i]);
  let state = [0, 0, 0];
  const [outputs, readings, commands] = [[0], [0], [] as number[]];
  const past = (line: number[], delay: number, now: number) => (now - delay >= 0 ? line[now - delay] : 0);
  for (let now = 0; now < DURATION; now += 1) {
    if (now % PERIOD === 0)
      commands.push(...new Array<number>(PERIOD).fill(controller.step(reference, past(readings, DEAD_TIME + SENSOR_DELAY, now))));
    const u = past(commands, COMPUTATION, now) + load;
    const a = slope(state, u);
    const b = slope(moved(state, a, 0.5), u);
    const c = slope(moved(state, b, 0.5), u);
    const d = slope(moved(state, c, 1), u);
    state = state.map((x, i) => x + (STEP / 6) * (a[i] + 2 * b[i] + 2 * c[i] + d[i]));
    outputs.push(state[0]);
    readings.push(state[2]);
  }
  return outputs.map((_, now) => past(outputs, DEAD_TIME, now));
};

describe('a response at and between the samples', () => {
  const model = buildLoop(input);
  const steps = respondSampled(model, model.sampled!, { stable: true, duration: DURATION * STEP });

  it.each(['reference', 'load'] as const)('to a %s step is that of an integration in fine steps', (kind) => {
    if (typeof steps === 'string') throw new Error(steps);
    const want = integrated(kind === 'reference' ? 1 : 0, kind === 'load' ? 1 : 0);
    const peak = Math.max(...want.map(Math.abs));
    for (let now = 0; now <= DURATION; now += 7)
      expect(Math.abs(steps[kind].output.valueAt(now * STEP) - want[now])).toBeLessThan(1e-7 * peak);
  });
});
