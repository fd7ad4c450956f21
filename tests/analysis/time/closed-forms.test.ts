import { describe, expect, it } from 'vitest';
import type { LoopInput } from '@/contract';
import { answer, curvesOf } from './loop-cast';

/** A panel's polynomial is good for about 1e-9 of the peak; hence the nine digits asked for below. */
const controller = (gains: { kp: number; ki?: number; kd?: number; derivativeFilterTime?: number }) => ({
  form: 'parallel' as const,
  ...gains,
});
const plant = (numerator: number[], denominator: number[], deadTime = 0) => ({
  kind: 'coefficients' as const,
  numerator,
  denominator,
  deadTime,
});

describe('a first-order loop, 1/s under P', () => {
  const loop: LoopInput = { plant: plant([1], [1, 0]), controller: controller({ kp: 4 }) };

  it('is 1 − e^(−4t), settles at ln 50/4 and rises in ln 9/4', () => {
    const { output } = curvesOf(loop).reference;
    for (const t of [0, 0.01, 0.3, 1]) expect(output.valueAt(t)).toBeCloseTo(1 - Math.exp(-4 * t), 9);
    const { metrics } = answer(loop);
    expect(metrics!.settlingTime).toBeCloseTo(Math.log(50) / 4, 8);
    expect(metrics!.riseTime).toBeCloseTo(Math.log(9) / 4, 8);
    expect(metrics).toMatchObject({
      finalValue: 1,
      steadyStateError: 0,
      overshootPercent: 0,
      undershootPercent: 0,
      peakTime: null,
      timeAtLimits: 0,
    });
  });

  it('has ∫e = 1/4, ∫t·e = 1/16, and a command that starts at 4 and varies by 8', () => {
    const { metrics, reference } = answer(loop, { duration: 8 });
    expect(metrics!.iae).toBeCloseTo(1 / 4, 9);
    expect(metrics!.itae).toBeCloseTo(1 / 16, 9);
    expect(metrics!.controlPeak).toBeCloseTo(4, 12);
    expect(metrics!.controlTotalVariation).toBeCloseTo(8, 9);
    expect(reference!.control[0]).toBe(4);
  });

  it('answers a load with (1 − e^(−4t))/4, which never comes back', () => {
    const { metrics } = answer(loop, { duration: 8 });
    expect(curvesOf(loop).load.output.valueAt(0.5)).toBeCloseTo((1 - Math.exp(-2)) / 4, 9);
    expect(metrics!.loadPeak).toBeCloseTo(0.25, 9);
    expect(metrics!.loadSettlingTime).toBeNull();
  });
});

/** domain.md, section 1: overshoot of ω²/(s² + 2ζω·s + ω²), exact. */
const overshoots = [
  [0.1, 72.92476143],
  [0.3, 37.23261049],
  [0.5, 16.30335348],
  [0.7, 4.598791026],
  [0.8, 1.516461986],
] as const;

describe.each(overshoots)('a second-order loop of damping %d', (damping, overshoot) => {
  const frequency = 3;
  const loop: LoopInput = { plant: plant([frequency ** 2], [1, 2 * damping * frequency, 0]), controller: controller({ kp: 1 }) };

  it('overshoots by e^(−πζ/√(1 − ζ²)) at π/(ω√(1 − ζ²))', () => {
    const { metrics } = answer(loop);
    expect(metrics!.overshootPercent).toBeCloseTo(overshoot, 6);
    expect(metrics!.peakTime).toBeCloseTo(Math.PI / (frequency * Math.sqrt(1 - damping ** 2)), 7);
  });
});

it('counts the overshoot of 1.8831 % of two lags under P, though it stays within the band of settling', () => {
  const loop: LoopInput = { plant: plant([1.46], [0.10506, 1.132, 1]), controller: controller({ kp: 2.71 }) };
  const frequency = Math.sqrt((1 + 1.46 * 2.71) / 0.10506);
  const damping = 1.132 / 0.10506 / (2 * frequency);
  expect(answer(loop).metrics!.overshootPercent).toBeCloseTo(100 * Math.exp((-Math.PI * damping) / Math.sqrt(1 - damping ** 2)), 7);
});

describe('e^(−θs)/((τc + θ)s) with τc = θ, every lag that a PI cancels', () => {
  const deadTime = 0.4;
  const loop: LoopInput = { plant: plant([1], [2 * deadTime, 0], deadTime), controller: controller({ kp: 1 }) };

  /** Σ (−K)^(k−1)·(t − kθ)^k/k! over the dead times gone by, K = 1/(2θ), after the first: worked out for this test. */
  const exact = (t: number) => {
    let sum = 0;
    let term = 1;
    for (let k = 1; k * deadTime <= t; k += 1) {
      term = (-1) ** (k - 1);
      for (let j = 1; j <= k; j += 1) term *= (t - k * deadTime) / (2 * deadTime) / j;
      sum += term;
    }
    return sum;
  };

  it('follows its closed form through thirteen dead times', () => {
    const { output } = curvesOf(loop).reference;
    for (let k = 0; k <= 26; k += 1) expect(Math.abs(output.valueAt(k * 0.19) - exact(k * 0.19))).toBeLessThan(1e-9);
  });

  it('peaks at 1.040519600 after 4.740078950 θ and settles after 6.0564481656 θ (domain.md, section 0)', () => {
    const { metrics } = answer(loop);
    expect(metrics!.overshootPercent).toBeCloseTo(4.05196, 6);
    expect(metrics!.peakTime! / deadTime).toBeCloseTo(4.74007895, 6);
    expect(metrics!.settlingTime! / deadTime).toBeCloseTo(6.0564481656, 7);
  });
});

describe('gains alone', () => {
  it('round a dead time make a staircase whose steps keep their edges', () => {
    const { output, control } = curvesOf({ plant: plant([0.5], [1], 0.2), controller: controller({ kp: 1 }) }).reference;
    expect(output.valueBefore(0.2)).toBe(0);
    const stairs = [0, 1, 2, 3].map((k) => output.valueAt(0.2 + 0.2 * k + 1e-9));
    [0.5, 0.25, 0.375, 0.3125].forEach((want, k) => expect(stairs[k]).toBeCloseTo(want, 12));
    expect(control.valueAt(0)).toBe(1);
    expect(control.valueAt(0.3)).toBeCloseTo(0.5, 12);
  });

  it('without dead time solve the algebraic loop at once', () => {
    const { metrics, reference } = answer({ plant: plant([0.5], [1]), controller: controller({ kp: 3 }) });
    expect(reference!.output[0]).toBeCloseTo(0.6, 12);
    expect(metrics).toMatchObject({ finalValue: 0.6, riseTime: 0, settlingTime: 0, overshootPercent: 0 });
  });

  it('jump with a plant that answers at once, (s + 2)/(s + 1) under P = 1: 1/2 + (1 − e^(−3t/2))/6', () => {
    const { output } = curvesOf({ plant: plant([1, 2], [1, 1]), controller: controller({ kp: 1 }) }).reference;
    for (const t of [0, 0.2, 1]) expect(output.valueAt(t)).toBeCloseTo(0.5 + (1 - Math.exp(-1.5 * t)) / 6, 9);
  });
});
