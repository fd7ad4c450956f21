import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyseLoop } from '@/analysis';
import { caseLoop, judgeCases, marksAlong, room } from '@/analysis/project';
import { Controller, PlantContent, type DesignContent, type FrozenCase, type Limit } from '@/contract';

const proportional = (kp: number): DesignContent => ({
  controller: Controller.parse({ form: 'parallel', kp }),
  sampling: 'continuous',
  actuator: null,
});
const plantOf = (numerator: number[], denominator: number[], deadTime = 0): FrozenCase['plant'] => ({
  ...PlantContent.parse({ plant: { kind: 'coefficients', numerator, denominator, deadTime }, deadTimeBasis: 'measured' }),
  id: 'plant',
  name: 'plant',
  revision: 1,
});
const aCase = (name: string, plant: FrozenCase['plant'], parameters: FrozenCase['parameters'] = {}): FrozenCase => ({
  id: name,
  name,
  plant,
  parameters,
  axes: {},
  basis: 'measured',
});
const demand = (quantity: Limit['quantity'], bound: Limit['bound'], limit: number): Limit => ({
  quantity,
  bound,
  limit,
  target: null,
  source: '',
});

function roomOf(design: DesignContent, cases: FrozenCase[], limits: Limit[]) {
  const numbers = cases.map((one) => analyseLoop(caseLoop(one, design), { curves: false }));
  const { results } = judgeCases(design, { cases, limits, operatingRange: [] }, numbers);
  return room({ design, cases, limits, results });
}

/** k/(s·(s+1)²): its phase crosses −180° at ω = 1, where |L| = k/2, so the gain margin is 2/k. */
const lagged = plantOf([1], [1, 2, 1, 0]);
/** e^(−sθ)/s: phase margin 90° − kθ and delay margin π/(2k) − θ, in rad and s, at ω = k. */
const integrator = (deadTime: number) => plantOf([1], [1, 0], deadTime);

describe('room', () => {
  it('in gain is the gain margin over its limit, rounded down, and stability ends at the margin itself', () => {
    const { moreGain } = roomOf(proportional(0.3), [aCase('nominal', lagged)], [demand('gainMargin', 'min', 2)]);
    // 2/0.3 = 6.667; half of it 3.333.
    expect(moreGain.any).toEqual({ amount: 3.33, quantity: 'gainMargin', limit: 2, case: { id: 'nominal', name: 'nominal' } });
    expect(moreGain.stability).toEqual(moreGain.any);
    expect(moreGain.instability).toMatchObject({ amount: 6.66, quantity: null });
    expect(moreGain.lookedTo).toBe(6.66);
  });

  it('in dead time is that of an integrator: (π/2 − φ)/k less what it has', () => {
    const { moreDeadTime } = roomOf(proportional(2), [aCase('nominal', integrator(0.1))], [demand('phaseMargin', 'min', 45)]);
    expect(moreDeadTime.any).toMatchObject({ amount: Math.floor((Math.PI / 8 - 0.1) * 1000) / 1000, quantity: 'phaseMargin' });
    expect(moreDeadTime.instability).toMatchObject({ amount: Math.floor((Math.PI / 4 - 0.1) * 1000) / 1000 });
  });

  it('in less gain is where a conditionally stable loop lets go', () => {
    // (s+1)²/s³ times k: s³ + k(s+1)² is stable for k > 1/2.
    const design = proportional(2);
    const { lessGain } = roomOf(design, [aCase('nominal', plantOf([1, 2, 1], [1, 0, 0, 0]))], [demand('gainReduction', 'max', 0.6)]);
    expect(lessGain.instability).toMatchObject({ amount: 0.25 });
    // The margin is 1/(2k), at most 0.6 down to k = 0.8333: 0.4167 of the gain there is, rounded towards all of it.
    expect(lessGain.any).toMatchObject({ amount: 0.42, quantity: 'gainReduction' });
  });

  it('is that of the case that breaks first, wherever it stands in the list', () => {
    const cases = [0.05, 0.2, 0.1].map((deadTime) => aCase(`${deadTime} s`, integrator(deadTime)));
    const { moreGain, moreDeadTime } = roomOf(proportional(2), cases, [demand('phaseMargin', 'min', 45)]);
    expect(moreGain.any).toMatchObject({ amount: Math.floor((Math.PI / 4 / 0.2 / 2) * 100) / 100, case: { name: '0.2 s' } });
    expect(moreDeadTime.any?.case.name).toBe('0.2 s');
  });

  it('is none at all where a limit is broken already', () => {
    const { moreGain, lessGain, moreDeadTime } = roomOf(
      proportional(7),
      [aCase('nominal', integrator(0.15))],
      [demand('phaseMargin', 'min', 45)],
    );
    expect([moreGain.any?.amount, lessGain.any?.amount, moreDeadTime.any?.amount]).toEqual([1, 1, 0]);
  });

  it('names a limit on performance, and the stability limits alone beside it', () => {
    const limits = [demand('settlingTime', 'max', 3), demand('phaseMargin', 'min', 45)];
    const { lessGain } = roomOf(proportional(2), [aCase('nominal', integrator(0))], limits);
    // An integrator under k settles to 2 % in ln 50/k: at most 3 s down to k = 1.304.
    expect(lessGain.any).toMatchObject({ amount: Math.ceil((Math.log(50) / 6) * 100) / 100, quantity: 'settlingTime' });
    expect(lessGain).toMatchObject({ stability: null, instability: null, lookedTo: 0.1 });
  });

  it('has only stability to tell of without limits', () => {
    expect(roomOf(proportional(0.3), [aCase('nominal', lagged)], []).moreGain).toMatchObject({
      any: null,
      stability: null,
      instability: { amount: 6.66 },
    });
  });
});

describe('a mark', () => {
  const limits = [demand('ms', 'max', 1.7), demand('phaseMargin', 'min', 45), demand('gainMargin', 'min', 2)];
  const plants = fc.record({
    gain: fc.double({ min: 0.3, max: 2, noNaN: true }),
    lag: fc.double({ min: 0.05, max: 2, noNaN: true }),
    deadTime: fc.double({ min: 0.01, max: 0.3, noNaN: true }),
  });
  const casesOf = (parts: { gain: number; lag: number; deadTime: number }[]) =>
    parts.map(({ gain, lag, deadTime }, index) => aCase(`case ${index}`, plantOf([gain], [lag, 1, 0], deadTime)));
  const failing = (cases: FrozenCase[], kp: number) => {
    const design = proportional(kp);
    const numbers = cases.map((one) => analyseLoop(caseLoop(one, design), { curves: false, responses: false }));
    return judgeCases(design, { cases, limits, operatingRange: [] }, numbers).results.flatMap((result) =>
      result.checks.filter(({ verdict }) => verdict === 'fail').map(({ quantity }) => `${quantity} in ${result.case.name}`),
    );
  };

  it('agrees with the judgement: nothing fails just inside it, and the named limit in the named case just outside', () => {
    fc.assert(
      fc.property(fc.array(plants, { minLength: 1, maxLength: 5 }), (parts) => {
        const cases = casesOf(parts);
        const { limit, instability } = marksAlong({ designAt: proportional, from: 0.05, to: 20, cases, limits });
        expect(limit).not.toBeNull();
        if (failing(cases, 0.05).length > 0) {
          expect(limit).toMatchObject({ holds: 0.05, breaks: 0.05 });
          return;
        }
        expect(failing(cases, limit!.holds)).toEqual([]);
        expect(failing(cases, limit!.breaks)).toContain(`${limit!.quantity} in ${limit!.case.name}`);
        expect(limit!.breaks - limit!.holds).toBeLessThanOrEqual(Math.max(5e-4 * limit!.breaks, 2e-5));
        if (instability) expect(instability.breaks).toBeGreaterThanOrEqual(limit!.holds);
      }),
      { numRuns: 25, seed: 4 },
    );
  });

  it('of stability stands where the loop lets go, also on the way down', () => {
    const cases = [aCase('nominal', plantOf([1, 2, 1], [1, 0, 0, 0]))];
    const { limit, instability } = marksAlong({ designAt: proportional, from: 2, to: 0, cases, limits: [] });
    expect(limit).toBeNull();
    expect(instability!.holds).toBeGreaterThanOrEqual(0.5);
    expect(instability!.holds).toBeCloseTo(0.5, 2);
    expect(instability!.breaks).toBeLessThanOrEqual(0.5);
  });

  it('is not there where nothing breaks before the end of the rule', () => {
    const cases = [aCase('nominal', integrator(0))];
    expect(marksAlong({ designAt: proportional, from: 1, to: 5, cases, limits })).toEqual({ limit: null, instability: null });
  });
});
