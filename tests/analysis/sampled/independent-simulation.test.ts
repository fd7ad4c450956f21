import { describe, expect, it } from 'vitest';
import { buildLoop, differenceEquation, loopAt } from '@/analysis';
import { ControllerRun } from '@/analysis/sampled/controller-run';
import { Loop, type LoopInput } from '@/contract';

const PERIOD = 0.1;
const SUBSTEPS = 40;
const DEAD_TIME = 0.25 * PERIOD + PERIOD;
const NATURAL = 4;
const DAMPING = 0.3;
const SENSOR = 0.05;

/** y″ + 2ζω·y′ + ω²·y = ω²·u(t − θ) and a first-order sensor, by Runge and Kutta's rule with steps that end where u changes. */
class TestPlant {
  private state = [0, 0, 0];

  get measured(): number {
    return this.state[2];
  }

  run(input: number, duration: number): void {
    const h = duration / SUBSTEPS;
    const slope = ([y, v, m]: number[]) => [v, NATURAL ** 2 * (input - y) - 2 * DAMPING * NATURAL * v, (y - m) / SENSOR];
    const moved = (from: number[], by: number[], share: number) => from.map((x, i) => x + share * h * by[i]);
    for (let k = 0; k < SUBSTEPS; k += 1) {
      const a = slope(this.state);
      const b = slope(moved(this.state, a, 0.5));
      const c = slope(moved(this.state, b, 0.5));
      const d = slope(moved(this.state, c, 1));
      this.state = this.state.map((x, i) => x + (h / 6) * (a[i] + 2 * b[i] + 2 * c[i] + d[i]));
    }
  }
}

/** y/e once a sine has settled, from sums over whole turns of it. */
const measuredLoop = (input: Loop, turnsPerSample: number) => {
  const controller = new ControllerRun(differenceEquation(input.controller, input.sampling!));
  const plant = new TestPlant();
  const commands = [0, 0];
  const [quiet, counted] = [4000, 2000];
  const sums = { y: [0, 0], e: [0, 0] };
  for (let k = 0; k < quiet + counted; k += 1) {
    const angle = 2 * Math.PI * turnsPerSample * k;
    const reference = Math.cos(angle);
    const sample = plant.measured;
    if (k >= quiet) {
      for (const [sum, value] of [
        [sums.y, sample],
        [sums.e, reference - sample],
      ] as const) {
        sum[0] += value * Math.cos(angle);
        sum[1] -= value * Math.sin(angle);
      }
    }
    commands.push(controller.step(reference, sample));
    const [before, last] = commands.slice(-3);
    plant.run(before, 0.25 * PERIOD);
    plant.run(last, 0.75 * PERIOD);
  }
  const size = sums.e[0] ** 2 + sums.e[1] ** 2;
  return {
    re: (sums.y[0] * sums.e[0] + sums.y[1] * sums.e[1]) / size,
    im: (sums.y[1] * sums.e[0] - sums.y[0] * sums.e[1]) / size,
  };
};

const design = (sampling: Partial<NonNullable<LoopInput['sampling']>>): Loop =>
  Loop.parse({
    plant: { kind: 'coefficients', numerator: [NATURAL ** 2], denominator: [1, 2 * DAMPING * NATURAL, NATURAL ** 2], deadTime: DEAD_TIME },
    sensor: { timeConstant: SENSOR },
    controller: {
      form: 'parallel',
      kp: 0.4,
      ki: 0.9,
      kd: 0.1,
      derivativeFilterTime: 0.08,
      setpointWeights: { proportional: 1, derivative: 1 },
      filters: [
        { kind: 'lowPass', timeConstant: 0.07 },
        { kind: 'notch', frequency: 9, depth: 0.2, width: 0.4 },
        { kind: 'leadLag', zeroTime: 0.2, poleTime: 0.1 },
      ],
    },
    sampling: { period: PERIOD, integral: 'backward', derivative: 'backward', ...sampling },
  } satisfies LoopInput);

describe('a sine through the running difference equation and a plant integrated apart', () => {
  const rules = [
    { integral: 'backward', derivative: 'backward' },
    { integral: 'forward', derivative: 'trapezoidal' },
    { integral: 'trapezoidal', derivative: 'trapezoidal' },
  ] as const;
  const cases = rules.flatMap((rule) => [0.01, 0.1, 0.4].map((turns) => ({ ...rule, turns })));

  it.each(cases)('$integral and $derivative, $turns turns per sample: L as the frequency response says', ({ turns, ...rule }) => {
    const input = design(rule);
    const want = loopAt(buildLoop(input))((2 * Math.PI * turns) / PERIOD);
    const got = measuredLoop(input, turns);
    expect(Math.hypot(got.re - want.re, got.im - want.im)).toBeLessThan(1e-7 * want.magnitude);
  });
});
