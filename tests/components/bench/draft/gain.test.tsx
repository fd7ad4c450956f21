import { describe, expect, it } from 'vitest';
import { clampGain, type Gain, gainWords, nudged } from '@/components/bench/draft/gain';
import { contentWith, type Form, settingsOf, startSettings } from '@/components/bench/draft/settings';
import type { Filter } from '@/contract';

const kept = { ...startSettings, kp: 1, integral: 0.4, derivative: -0.05 };
const nudge = (gain: Gain, settings: typeof startSettings, fraction: number) =>
  nudged({ gain, settings, kept: settings === startSettings ? startSettings[gain] : kept[gain], fraction });

describe('a nudge', () => {
  it('is a fraction of the gain', () => expect(nudge('kp', kept, 0.1)).toBe(1.1));
  it('moves a negative gain away from zero when it goes down', () => expect(nudge('derivative', kept, -0.1)).toBe(-0.055));
  it('near zero is a fraction of the kept value', () => expect(nudge('integral', { ...kept, integral: 0 }, 0.1)).toBe(0.04));
  it('from zero with zero kept is a fraction of one', () => expect(nudge('derivative', startSettings, 0.1)).toBe(0.1));
  it('never takes Tf below zero', () => expect(nudge('filterTime', startSettings, -0.1)).toBe(0));
  it('passes through zero for a gain', () => expect(nudge('derivative', { ...kept, derivative: 0.0001 }, -0.1)).toBeCloseTo(-0.0049, 10));
  it('keeps an integral time above zero however short it is', () =>
    expect(nudge('integral', { ...kept, form: 'ideal', integral: 0.0004 }, -0.1)).toBe(0.00036));
  it('moves nothing where there is no integral action', () =>
    expect(nudge('integral', { ...kept, form: 'ideal', integral: null }, 0.1)).toBeNull());
});

describe('a gain', () => {
  it('may be negative, a time may not', () => {
    expect(clampGain('kp', 'parallel', -1)).toBe(-1);
    expect(clampGain('derivative', 'parallel', -1)).toBe(-1);
    expect(clampGain('derivative', 'series', -1)).toBe(0);
    expect(clampGain('filterTime', 'parallel', -1)).toBe(0);
    expect(clampGain('integral', 'ideal', 0)).toBeGreaterThan(0);
  });

  it('is called what its form calls it', () => {
    expect(gainWords('integral', 'parallel').label).toBe('Ki');
    expect(gainWords('integral', 'ideal').label).toBe('Ti');
    expect(gainWords('derivative', 'series')).toEqual({ label: 'Td', name: 'Derivative time' });
  });
});

describe('settings and a design', () => {
  const filters: Filter[] = [
    { kind: 'notch', frequency: 40, depth: 0.1, width: 0.5 },
    { kind: 'lowPass', timeConstant: 0.01 },
  ];
  it.each<[Form, number | null]>([
    ['parallel', 0.4],
    ['ideal', 2.5],
    ['ideal', null],
    ['series', 2.5],
  ])('in %s form with an integral of %s become each other without loss', (form, integral) => {
    const settings = {
      ...startSettings,
      form,
      integral,
      kp: 1.05,
      derivative: 0.3,
      filterTime: 0.03,
      proportionalWeight: 0.6,
      feedforward: 0.2,
      filters,
      statedContinuous: true,
    };
    expect(settingsOf(contentWith(null, settings))).toEqual(settings);
  });

  it('leave actuator and sample period of the kept design alone', () => {
    const sampling = { period: 0.01, integral: 'backward', derivative: 'backward', computationDelay: 0 } as const;
    const base = { ...contentWith(null, startSettings), sampling };
    const next = contentWith(base, { ...startSettings, kp: 2 });
    expect(next.sampling).toEqual(sampling);
  });
});
