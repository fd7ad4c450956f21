import { describe, expect, it } from 'vitest';
import { buildLoop } from '@/analysis';
import { sampledModel } from '@/analysis/sampled/sampled-model';
import { coefficients, loopOf, numbersOf, pid } from '../support/cast';
import { every } from './cast';

const DEGREES = 1e-5;

/** Pulse-transfer functions that textbooks of digital control print, with the digits of an independent computation at 30 digits. */
describe('the zero-order-hold equivalent', () => {
  const seen = (denominator: number[]) => {
    const model = buildLoop(loopOf(coefficients([1], denominator), pid(1), every(1)));
    const { gain, zeros, poles } = sampledModel(model, model.sampled!).seen.rational;
    return { gain, zero: 1 + zeros[0].re, poles: poles.map(({ re }) => 1 + re).sort() };
  };

  it('of 1/(s(s + 1)) at 1 s', () => {
    const { gain, zero, poles } = seen([1, 1, 0]);
    expect(gain).toBeCloseTo(Math.exp(-1), 14);
    expect(zero).toBeCloseTo(-(1 - 2 / Math.E) / (1 / Math.E), 13);
    expect(zero).toBeCloseTo(-0.7182818285, 10);
    expect(poles).toEqual([expect.closeTo(0.3678794412, 10), 1]);
  });

  it('of 1/(s(10s + 1)) at 1 s', () => {
    const { gain, zero, poles } = seen([10, 1, 0]);
    expect(gain).toBeCloseTo(0.04837418036, 11);
    expect(zero).toBeCloseTo(-0.9672184884, 10);
    expect(poles).toEqual([expect.closeTo(0.904837418, 9), 1]);
  });
});

describe('1/(s(s + 1)) under proportional control at 1 s', () => {
  const at = (kp: number) => numbersOf(coefficients([1], [1, 1, 0]), pid(kp), every(1));

  it('has the margins computed elsewhere', () => {
    const { margins, sensitivity } = at(1);
    expect(Math.abs(margins.phase!.degrees - 30.3842728)).toBeLessThan(DEGREES);
    expect(margins.phase!.frequency).toBeCloseTo(0.771734028, 8);
    expect(margins.gain!.factor).toBeCloseTo(2.39221119118, 10);
    expect(margins.gain!.frequency).toBeCloseTo(1.3243934565, 9);
    expect(sensitivity.ms.value).toBeCloseTo(2.534855533, 8);
    expect(sensitivity.mt.value).toBeCloseTo(2.013195567, 8);
  });

  it('is stable up to K = 2.39221119118 and no further', () => {
    expect(at(2.39221).closedLoop.stable).toBe(true);
    expect(at(2.39222).closedLoop).toMatchObject({ stable: false, unstablePoles: 2 });
  });
});

describe('a speed hold by backward-Euler PI with one sample of computation', () => {
  const plant = coefficients([1.3203], [1, 0.0101]);

  it.each([
    [0.02, 73.4924545, 75.4450815, 1.0193346],
    [0.1, 68.9432984, 14.8529209, 1.1004431],
    [0.2, 63.1684325, 7.2790571, 1.2177593],
  ])('at %f s', (period, degrees, factor, ms) => {
    const { margins, sensitivity } = numbersOf(plant, pid(0.5, 0.1), every(period, { computationDelay: period }));
    expect(Math.abs(margins.phase!.degrees - degrees)).toBeLessThan(DEGREES);
    expect(margins.gain!.factor).toBeCloseTo(factor, 6);
    expect(sensitivity.ms.value).toBeCloseTo(ms, 6);
  });

  it('in continuous time has no limit upward: sampling alone brings one', () => {
    const { margins, sensitivity } = numbersOf(plant, pid(0.5, 0.1));
    expect(Math.abs(margins.phase!.degrees - 74.6203398)).toBeLessThan(DEGREES);
    expect(margins.gain).toBeNull();
    expect(sensitivity.ms.value).toBe(1);
  });
});

/** A car's driveline: three crossovers, stable; the last one sets the delay margin. Independent computation at 30 digits. */
describe('a shuffle resonance in continuous time', () => {
  const mode = (2 * Math.PI * 4) ** 2;
  const plant = {
    kind: 'roots' as const,
    gain: mode / (1680 * 0.05),
    zeros: [],
    poles: [
      { re: -19.5 / 1680, im: 0 },
      { re: -20, im: 0 },
      ...[1, -1].map((sign) => ({ re: -0.03 * 8 * Math.PI, im: sign * 8 * Math.PI * Math.sqrt(1 - 0.03 ** 2) })),
    ],
    deadTime: 0.05,
  };

  it.each([
    {
      kp: 6000,
      crossovers: [
        [3.589697308, 67.6292264],
        [24.18022755, -67.7073168],
        [25.848857, -169.6428987],
      ],
      factor: 3.418901879,
      ms: 1.492624559,
    },
    {
      kp: 12000,
      crossovers: [
        [7.329418735, 47.0898059],
        [22.40190856, -37.23193],
        [26.89230865, 163.3025259],
      ],
      factor: 1.709450939,
      ms: 2.41389259,
    },
  ])('kp = $kp', ({ kp, crossovers, factor, ms }) => {
    const { closedLoop, margins, sensitivity } = numbersOf(plant, pid(kp, kp / 10));
    expect(closedLoop.stable).toBe(true);
    expect(margins.gainCrossovers).toHaveLength(3);
    crossovers.forEach(([frequency, degrees], i) => {
      expect(margins.gainCrossovers[i].frequency).toBeCloseTo(frequency, 7);
      expect(Math.abs(margins.gainCrossovers[i].phaseMarginDegrees - degrees)).toBeLessThan(DEGREES);
    });
    expect(margins.gain!.factor).toBeCloseTo(factor, 8);
    expect(sensitivity.ms.value).toBeCloseTo(ms, 8);
  });

  it('may come 0.1285301773 s later, which the first crossover alone would not tell', () => {
    expect(numbersOf(plant, pid(6000, 600)).margins.delay!.seconds).toBeCloseTo(0.1285301773, 9);
  });
});
