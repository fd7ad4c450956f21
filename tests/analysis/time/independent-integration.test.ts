import { describe, expect, it } from 'vitest';
import type { LoopInput } from '@/contract';
import { curvesOf } from './loop-cast';

const DEAD_TIME = 0.15;
const SENSOR_LAG = 0.05;
const PLANT_LAG = 0.8;
const DERIVATIVE_LAG = 0.04;
const [KP, KI, KD, B, C, F] = [1.9, 1.6, 0.12, 0.7, 0.2, 0.3];
const FILTER_LAG = 0.02;

const loop: LoopInput = {
  plant: { kind: 'coefficients', numerator: [1.3], denominator: [PLANT_LAG, 1], deadTime: DEAD_TIME },
  sensor: { timeConstant: SENSOR_LAG, deadTime: 0 },
  controller: {
    form: 'parallel',
    kp: KP,
    ki: KI,
    kd: KD,
    derivativeFilterTime: DERIVATIVE_LAG,
    setpointWeights: { proportional: B, derivative: C },
    feedforward: { gain: F },
    filters: [{ kind: 'lowPass', timeConstant: FILTER_LAG }],
  },
};

/**
 * The same loop written down once more from numerics.md and integrated by the classical Runge–Kutta rule with steps of
 * DEAD_TIME/perDeadTime. The delayed input of a half step is the mean of its neighbours: second order, so that two step
 * sizes extrapolate to fourth.
 */
function integrate(perDeadTime: number, end: number, [r, d]: readonly [number, number]) {
  const h = DEAD_TIME / perDeadTime;
  const inputs: number[] = [];
  const outputs: number[] = [0];
  let x = [0, 0, 0, 0, 0];
  const slope = ([integral, lagged, u, y, ym]: number[], delayed: number) => [
    KI * (r - ym),
    (C * r - ym - lagged) / DERIVATIVE_LAG,
    (KP * (B * r - ym) + integral + (KD / DERIVATIVE_LAG) * (C * r - ym - lagged) + F * r - u) / FILTER_LAG,
    (1.3 * delayed - y) / PLANT_LAG,
    (y - ym) / SENSOR_LAG,
  ];
  const along = (a: number[], k: number[], step: number) => a.map((value, i) => value + step * k[i]);
  for (let n = 0; n * h < end; n += 1) {
    inputs.push(x[2] + d);
    const at = (k: number) => (k < 0 ? 0 : inputs[k]);
    const [from, to] = [at(n - perDeadTime), n + 1 - perDeadTime < 1 ? 0 : at(n + 1 - perDeadTime)];
    const k1 = slope(x, from);
    const k2 = slope(along(x, k1, h / 2), (from + to) / 2);
    const k3 = slope(along(x, k2, h / 2), (from + to) / 2);
    const k4 = slope(along(x, k3, h), to);
    x = x.map((value, i) => value + (h / 6) * (k1[i] + 2 * k2[i] + 2 * k3[i] + k4[i]));
    outputs.push(x[3]);
  }
  return (k: number) => outputs[k * perDeadTime];
}

describe('a PID with weights, feedforward, filter, sensor lag and dead time', () => {
  it.each([
    ['reference', [1, 0]],
    ['load', [0, 1]],
  ] as const)('follows an independent integration of its %s response', (kind, sizes) => {
    const end = 20 * DEAD_TIME;
    const coarse = integrate(400, end, sizes);
    const fine = integrate(800, end, sizes);
    const { output } = curvesOf(loop)[kind];
    for (let k = 1; k <= 20; k += 1) {
      const extrapolated = fine(k) + (fine(k) - coarse(k)) / 3;
      expect(Math.abs(output.valueAt(k * DEAD_TIME) - extrapolated)).toBeLessThan(1e-7);
    }
  });
});
