import { describe, expect, it } from 'vitest';
import type { Limit } from '@/contract';
import { chartLimits } from '@/figures';

const demand = (quantity: Limit['quantity'], bound: Limit['bound'], limit: number): Limit => ({
  quantity,
  bound,
  limit,
  target: null,
  source: '',
});

describe('what of the demands the charts draw', () => {
  it('is every demand that has a place on a chart', () => {
    const limits = [demand('phaseMargin', 'min', 45), demand('settlingTime', 'max', 6), demand('delayMargin', 'min', 0.2)];
    expect(chartLimits(limits)).toEqual({ phaseMargin: 45, settlingTime: 6 });
  });

  it('draws a least modulus margin as the same circle as a greatest Ms, and the stricter of both', () => {
    expect(chartLimits([demand('modulusMargin', 'min', 0.625)]).ms).toBe(1.6);
    expect(chartLimits([demand('modulusMargin', 'min', 0.625), demand('ms', 'max', 1.5)]).ms).toBe(1.5);
  });

  it('has the ends of the actuator', () => {
    const actuator = { minimum: -1, maximum: 2, rate: null, operatingCommand: 0, antiWindup: 'none', trackingTime: null } as const;
    expect(chartLimits([], actuator)).toMatchObject({ controlMinimum: -1, controlMaximum: 2 });
  });
});
