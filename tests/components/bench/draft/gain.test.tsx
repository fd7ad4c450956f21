import { describe, expect, it } from 'vitest';
import { clampGain, gainUnit, nudged } from '@/components/bench/draft/gain';
import { contentWith, settingsOf, startSettings } from '@/components/bench/draft/settings';

const kept = { ...startSettings, kp: 1, ki: 0.4, kd: -0.05 };

describe('a nudge', () => {
  it('is a fraction of the gain', () => expect(nudged('kp', kept, kept, 0.1)).toBe(1.1));
  it('moves a negative gain away from zero when it goes down', () => expect(nudged('kd', kept, kept, -0.1)).toBe(-0.055));
  it('near zero is a fraction of the kept value', () => expect(nudged('ki', { ...kept, ki: 0 }, kept, 0.1)).toBe(0.04));
  it('from zero with zero kept is a fraction of one', () => expect(nudged('kd', startSettings, startSettings, 0.1)).toBe(0.1));
  it('never takes Tf below zero', () => expect(nudged('filterTime', startSettings, startSettings, -0.1)).toBe(0));
  it('passes through zero for a gain', () => expect(nudged('kd', { ...kept, kd: 0.0001 }, kept, -0.1)).toBeCloseTo(-0.0049, 10));
});

describe('a gain', () => {
  it('may be negative, a time may not', () => {
    expect(clampGain('kp', -1)).toBe(-1);
    expect(clampGain('filterTime', -1)).toBe(0);
  });

  it('has the unit that the plant gives it', () => {
    const units = { input: 'kN·m', output: 'm/s' };
    expect(gainUnit('kp', units)).toBe('kN·m/(m/s)');
    expect(gainUnit('ki', units)).toBe('kN·m/((m/s)·s)');
    expect(gainUnit('kd', units)).toBe('kN·m·s/(m/s)');
    expect(gainUnit('filterTime', units)).toBe('s');
    expect(gainUnit('kp', { input: '', output: 'm/s' })).toBe('');
    expect(gainUnit('ki', { input: '%', output: 'rad' })).toBe('%/(rad·s)');
    expect(gainUnit('kd', { input: 'N/mm', output: 'rad' })).toBe('(N/mm)·s/rad');
  });
});

describe('settings and a design', () => {
  it('become each other without loss', () => {
    const settings = {
      ...startSettings,
      kp: 1.05,
      kd: -0.3,
      filterTime: 0.03,
      proportionalWeight: 0.6,
      feedforward: 0.2,
      statedContinuous: true,
    };
    expect(settingsOf(contentWith(null, settings))).toEqual(settings);
  });

  it('leave filters, actuator and sample period of the kept design alone', () => {
    const sampling = { period: 0.01, integral: 'backward', derivative: 'backward', computationDelay: 0 } as const;
    const base = contentWith(null, startSettings);
    const design = { ...base, sampling, controller: { ...base.controller, filters: [{ kind: 'lowPass' as const, timeConstant: 0.1 }] } };
    const next = contentWith(design, { ...startSettings, kp: 2 });
    expect(next.sampling).toEqual(sampling);
    expect(next.controller.filters).toEqual(design.controller.filters);
  });

  it('of another form are not the bench’s to move', () => {
    const { controller } = contentWith(null, startSettings);
    const { setpointWeights, feedforward, filters, derivativeFilterTime } = controller;
    const ideal = { form: 'ideal' as const, kp: 1, ti: 2, td: 0, setpointWeights, feedforward, filters, derivativeFilterTime };
    expect(settingsOf({ controller: ideal, sampling: null, actuator: null })).toBeNull();
  });
});
