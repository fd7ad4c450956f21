import { describe, expect, it } from 'vitest';
import { lastIntegralTime, startIntegralTime } from '@/components/bench/draft/integral-time';
import { startSettings } from '@/components/bench/draft/settings';

describe('integral action that is switched on again', () => {
  it('has the time that it last had in this form', () => {
    const ideal = { ...startSettings, form: 'ideal' as const };
    const past = [
      startSettings,
      { ...ideal, integral: 3 },
      { ...ideal, integral: 2.5 },
      { ...ideal, form: 'series' as const, integral: 2 },
    ];
    expect(lastIntegralTime(past, 'ideal')).toBe(2.5);
    expect(lastIntegralTime([startSettings], 'ideal')).toBeNull();
  });

  // atan(1/(ω·Ti)) = atan(1/10) = 5.71°.
  it('for the first time costs less than six degrees at the crossover', () => {
    expect(startIntegralTime(2.06)).toBe(4.9);
    expect((Math.atan(1 / (2.06 * 4.9)) * 180) / Math.PI).toBeLessThan(6);
    expect(startIntegralTime(undefined)).toBe(1);
  });
});
