import { describe, expect, it } from 'vitest';
import { limitUse } from '@/analysis/project';
import type { Limit } from '@/contract';

const demand = (parts: Partial<Limit>): Limit => ({
  quantity: 'phaseMargin',
  bound: 'min',
  limit: 45,
  target: 50,
  source: 'team rule',
  ...parts,
});

describe('use of a limit', () => {
  it('is 0 on the target, 1 on the limit, negative inside and above 1 outside', () => {
    expect(limitUse(demand({}), 50)).toBe(0);
    expect(limitUse(demand({}), 45)).toBe(1);
    expect(limitUse(demand({}), 55)).toBe(-1);
    expect(limitUse(demand({}), 42.5)).toBe(1.5);
  });

  it('takes a phase margin by its magnitude', () => {
    expect(limitUse(demand({}), -47.5)).toBe(0.5);
  });

  it('compares gain margins in decibels', () => {
    const sixOverSeven = demand({ quantity: 'gainMargin', limit: 10 ** (6 / 20), target: 10 ** (7 / 20) });
    expect(limitUse(sixOverSeven, 10 ** (6.5 / 20))).toBeCloseTo(0.5, 12);
  });

  it('compares a gain reduction in decibels, downwards', () => {
    const reduction = demand({ quantity: 'gainReduction', bound: 'max', limit: 10 ** (-6 / 20), target: 10 ** (-7 / 20) });
    expect(limitUse(reduction, 10 ** (-6.25 / 20))).toBeCloseTo(0.75, 12);
  });

  it('compares Ms as the distance 1/Ms', () => {
    const ms = demand({ quantity: 'ms', bound: 'max', limit: 2, target: 1.6 });
    // 1/1.6 = 0.625, 1/2 = 0.5: a distance of 0.55 has used 0.6 of the way. The plain ratio would say (1.6 − 1.8182)/(1.6 − 2) = 0.545.
    expect(limitUse(ms, 1 / 0.55)).toBeCloseTo(0.6, 12);
  });

  it('draws a ruler a tenth of the limit long where no target was set', () => {
    expect(limitUse(demand({ quantity: 'overshootPercent', bound: 'max', limit: 20, target: null }), 19)).toBeCloseTo(0.5, 12);
    expect(limitUse(demand({ quantity: 'bandwidth', bound: 'min', limit: 3, target: null }), 3.3)).toBeCloseTo(0, 12);
  });

  it('has no ruler where limit and target fall together', () => {
    expect(limitUse(demand({ quantity: 'overshootPercent', bound: 'max', limit: 0, target: null }), 3)).toBeNull();
  });
});
