import { describe, expect, it } from 'vitest';
import type { LoopInput } from '@/contract';
import { timeResponse } from '@/analysis/time';
import { respond } from '@/analysis/time/time-response';
import { answer, curvesOf, modelOf, stabilityOf, unitSteps } from './loop-cast';

const lag = (deadTime: number, lagTime = 1): LoopInput['plant'] => ({
  kind: 'coefficients',
  numerator: [1],
  denominator: [lagTime, 1],
  deadTime,
});
const pi = (kp: number, ki: number) => ({ form: 'parallel' as const, kp, ki });
const unstable = { stable: false, closedLoopPoles: null };

describe('an unstable loop', () => {
  const loop: LoopInput = { plant: lag(1), controller: pi(5, 0) };

  it('is shown until it has grown tenfold, without metrics', () => {
    const { timeResponse: found } = timeResponse(modelOf(loop), unitSteps, unstable);
    const { output, time } = found!.reference!;
    expect(found!.metrics).toBeNull();
    expect(Math.abs(output[output.length - 1])).toBeCloseTo(10, 3);
    expect(Math.max(...output.map(Math.abs))).toBeCloseTo(10, 3);
    expect(time.length).toBeGreaterThanOrEqual(1000);
  });

  it('that only swings is shown for many swings', () => {
    const oscillator: LoopInput = { plant: { kind: 'coefficients', numerator: [1], denominator: [1, 0, 0] }, controller: pi(1, 0) };
    const { timeResponse: found } = timeResponse(modelOf(oscillator), unitSteps, { stable: false, closedLoopPoles: [{ re: 0, im: 1 }, { re: 0, im: -1 }] }); // prettier-ignore
    const end = found!.reference!.time[found!.reference!.time.length - 1];
    expect(end).toBeGreaterThan(60 * Math.PI);
    expect(end).toBeLessThan(120 * Math.PI);
  });

  it('that outgrows all numbers within the time asked for has no response, and says so', () => {
    const { timeResponse: found, warnings } = timeResponse(modelOf(loop), { ...unitSteps, duration: 1e4 }, unstable);
    expect(found).toBeNull();
    expect(warnings.map(({ code }) => code)).toEqual(['responseUnbounded']);
  });
});

describe('what cannot be simulated', () => {
  const improper = { form: 'parallel' as const, kp: 1, ki: 0.5, kd: 0.2 };

  it('is an unfiltered derivative', () => {
    const model = modelOf({ plant: lag(0.1), controller: improper });
    const { timeResponse: found, warnings } = timeResponse(model, unitSteps, stabilityOf(model));
    expect(found).toBeNull();
    expect(warnings).toEqual([{ code: 'improperController', message: expect.stringMatching(/^The derivative.*\.$/) }]);
  });

  it('but with a low-pass behind it that derivative answers as the same PID in other words', () => {
    const filter = { kind: 'lowPass' as const, timeConstant: 0.05 };
    const filtered = curvesOf({ plant: lag(0.1), controller: { ...improper, filters: [filter] } }).reference;
    // (kp + ki/s + kd·s)/(1 + s·τ) = kp − ki·τ + ki/s + (kd − τ·(kp − ki·τ))·s/(1 + s·τ)
    const kp = 1 - 0.5 * 0.05;
    const same = {
      form: 'parallel' as const,
      kp,
      ki: 0.5,
      kd: 0.2 - 0.05 * kp,
      derivativeFilterTime: 0.05,
      setpointWeights: { derivative: 1 },
    };
    const weighted = { ...improper, filters: [filter], setpointWeights: { derivative: 1 } };
    const [one, other] = [weighted, same].map((controller) => curvesOf({ plant: lag(0.1), controller }).reference);
    for (const t of [0, 0.05, 0.15, 0.4, 1, 3]) expect(one.output.valueAt(t)).toBeCloseTo(other.output.valueAt(t), 8);
    expect(one.control.valueAt(0)).toBeCloseTo(0.2 / 0.05, 9);
    expect(filtered.control.valueAt(0)).toBeCloseTo(0, 12);
  });

  it('is an algebraic loop of gain −1', () => {
    const model = modelOf({ plant: { kind: 'coefficients', numerator: [-1], denominator: [1] }, controller: pi(1, 0) });
    expect(respond(model, null, unstable)).toMatchObject({ code: 'algebraicLoop' });
  });

  it('is a motion a billion times faster than the dead time that never dies', () => {
    const model = modelOf({
      plant: { kind: 'roots', gain: 1, poles: [{ re: 0, im: 1e9 }, { re: 0, im: -1e9 }], deadTime: 1 }, // prettier-ignore
      controller: pi(1, 0),
    });
    expect(respond(model, null, unstable)).toMatchObject({ code: 'responseTooLong' });
  });
});

describe('a duration that was asked for', () => {
  it.each([0.37, 40])('of %d s is the axis, from 0 to its end', (duration) => {
    const { reference, load, metrics } = answer({ plant: lag(0.3), controller: pi(1, 1) }, { duration });
    for (const { time, output, control } of [reference!, load!]) {
      expect([time[0], time[time.length - 1]]).toEqual([0, duration]);
      expect(time.every((t, k) => k === 0 || t > time[k - 1])).toBe(true);
      expect([output.length, control.length]).toEqual([time.length, time.length]);
      expect(time.length).toBeGreaterThanOrEqual(1000);
    }
    expect(metrics!.settlingTime).toBeGreaterThan(1);
  });
});

describe('steps of size 0', () => {
  it('have no times to tell and no excursions', () => {
    const { metrics, reference } = answer({ plant: lag(0.3), controller: pi(1, 1) }, { referenceStep: 0, loadStep: 0 });
    expect(reference!.output.every((y) => y === 0)).toBe(true);
    expect(metrics).toMatchObject({ finalValue: 0, riseTime: null, overshootPercent: null, iae: 0, loadPeak: 0, loadSettlingTime: null });
  });
});

describe('far apart time scales', () => {
  it('eight decades apart keep the slow response: lags of 1e-4 and 1e4 s under P are the slow lag alone', () => {
    const loop: LoopInput = { plant: { kind: 'roots', gain: 1, poles: [{ re: -1e4, im: 0 }, { re: -1e-4, im: 0 }], deadTime: 0 }, controller: pi(9, 0) }; // prettier-ignore
    const { output } = curvesOf(loop).reference;
    const [sum, product] = [1e4 + 1e-4, 1 + 9];
    const fast = sum / 2 + Math.sqrt((sum / 2) ** 2 - product);
    const slow = product / fast;
    const exact = (t: number) => 0.9 * (1 - (fast * Math.exp(-slow * t) - slow * Math.exp(-fast * t)) / (fast - slow));
    for (const t of [1e-4, 1, 1e3, 3e3]) expect(Math.abs(output.valueAt(t) - exact(t))).toBeLessThan(2e-9);
  });

  it('a dead time of 0.1 ms in a response of ten minutes costs a few hundred panels and stays exact', () => {
    const delayed = curvesOf({ plant: lag(1e-4, 100), controller: pi(1, 0.01) });
    expect(delayed.reference.control.panels).toBeLessThan(400);
    const prompt = curvesOf({ plant: lag(0, 100), controller: pi(1, 0.01) }).reference.output;
    // kp = ki·lag cancels the pole: y = 1 − e^(−t/100) without dead time; with θ, to first order in θ, e(t) gains θ·t/100².
    for (const t of [10, 100, 300]) {
      const first = prompt.valueAt(t) - (1e-4 / 100) * Math.exp(-t / 100) * (1 - t / 100);
      expect(Math.abs(delayed.reference.output.valueAt(t) - first)).toBeLessThan(1e-9);
    }
  });

  it('a lightly damped mode of twelve poles with dead time is resolved to its end', () => {
    const pairs = [2, 5, 11, 23, 41, 80].flatMap((w) => [{ re: -0.005 * w, im: w }, { re: -0.005 * w, im: -w }]); // prettier-ignore
    const gain = pairs.filter(({ im }) => im > 0).reduce((product, { re, im }) => product * (re * re + im * im), 1);
    const loop: LoopInput = { plant: { kind: 'roots', gain, poles: pairs, deadTime: 0.05 }, controller: pi(0, 0.004) };
    const { metrics } = answer(loop);
    expect(metrics!.settlingTime).toBeGreaterThan(100);
    expect(metrics!.steadyStateError).toBe(0);
  });
});
