import { describe, expect, it } from 'vitest';
import { differenceEquation } from '@/analysis';
import { Loop, type LoopInput } from '@/contract';
import { every } from './cast';

const equation = (controller: LoopInput['controller'], rules: Parameters<typeof every>[1] = {}) => {
  const loop = Loop.parse({ plant: { kind: 'coefficients', numerator: [1], denominator: [1, 1] }, controller, ...every(0.1, rules) });
  return differenceEquation(loop.controller, loop.sampling!);
};

describe('the difference equation of a design', () => {
  it.each([
    ['backward', { now: 0.2, before: 0 }],
    ['forward', { now: 0, before: 0.2 }],
    ['trapezoidal', { now: 0.1, before: 0.1 }],
  ] as const)('integrates by the %s rule', (integral, want) => {
    expect(equation({ form: 'parallel', kp: 1, ki: 2 }, { integral }).integral).toEqual(want);
  });

  it('filters the derivative by either rule, and without filter by backward Euler', () => {
    const controller = { form: 'parallel', kp: 0, kd: 3, derivativeFilterTime: 0.2 } as const;
    expect(equation(controller).derivative).toEqual({ decay: expect.closeTo(2 / 3, 15), gain: expect.closeTo(10, 14) });
    expect(equation(controller, { derivative: 'trapezoidal' }).derivative).toEqual({ decay: expect.closeTo(0.6, 15), gain: 12 });
    expect(equation({ ...controller, derivativeFilterTime: 0 }).derivative).toEqual({ decay: 0, gain: 30 });
  });

  it('converts the series form first', () => {
    const { proportional, integral, derivative } = equation({ form: 'series', kp: 2, ti: 1, td: 0.25, derivativeFilterTime: 0 });
    expect({ proportional, integral, derivative }).toEqual({
      proportional: 2.5,
      integral: { now: 0.2, before: 0 },
      derivative: { decay: 0, gain: 5 },
    });
  });

  it('leaves out what is not there', () => {
    const { integral, derivative, filters } = equation({
      form: 'ideal',
      kp: 1,
      ti: null,
      filters: [{ kind: 'lowPass', timeConstant: 0 }],
    });
    expect({ integral, derivative, filters }).toEqual({ integral: null, derivative: null, filters: [] });
  });

  it('has filters with a gain of 1 at rest and a notch that is deepest where it was asked for', () => {
    const notch = { kind: 'notch', frequency: 20, depth: 0.1, width: 0.3 } as const;
    const [low, deep] = equation({ form: 'parallel', kp: 1, filters: [{ kind: 'lowPass', timeConstant: 0.05 }, notch] }).filters;
    expect(low).toEqual({ forward: [0.5, 0.5], back: [0] });
    const at = (angle: number) => {
      const value = (terms: readonly number[]) => ({
        re: terms.reduce((sum, c, i) => sum + c * Math.cos(i * angle), 0),
        im: terms.reduce((sum, c, i) => sum - c * Math.sin(i * angle), 0),
      });
      const [above, below] = [value(deep.forward), value([1, ...deep.back])];
      return Math.hypot(above.re, above.im) / Math.hypot(below.re, below.im);
    };
    expect(at(0)).toBeCloseTo(1, 14);
    expect(at(2)).toBeCloseTo(0.1, 14);
    expect(at(1.99)).toBeGreaterThan(0.1);
    expect(at(2.01)).toBeGreaterThan(0.1);
  });
});
