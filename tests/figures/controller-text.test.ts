import { describe, expect, it } from 'vitest';
import { filterText, gainUnit } from '@/figures';

describe('the unit of a gain', () => {
  it('is the one that the plant gives it', () => {
    const units = { input: 'kN·m', output: 'm/s' };
    expect(gainUnit('Kp', units)).toBe('kN·m/(m/s)');
    expect(gainUnit('Ki', units)).toBe('kN·m/((m/s)·s)');
    expect(gainUnit('Kd', units)).toBe('kN·m·s/(m/s)');
    expect(gainUnit('Ki', { input: '%', output: 'rad' })).toBe('%/(rad·s)');
    expect(gainUnit('Kd', { input: 'N/mm', output: 'rad' })).toBe('(N/mm)·s/rad');
  });

  it('of a time is s, also where the plant names none', () => {
    const none = { input: '', output: 'm/s' };
    expect(gainUnit('Kp', none)).toBe('');
    for (const time of ['Ti', 'Td', 'Tf'] as const) expect(gainUnit(time, none)).toBe('s');
  });
});

describe('a filter in words', () => {
  it('names all that it is set to, with units', () => {
    expect(filterText({ kind: 'lowPass', timeConstant: 0.02 }, 'rad/s')).toBe('time constant 0.02 s');
    expect(filterText({ kind: 'leadLag', zeroTime: 0.2, poleTime: 0.025 }, 'rad/s')).toBe('zero 0.20 s, pole 0.025 s');
  });

  it('follows the reader’s unit of frequency', () => {
    const notch = { kind: 'notch', frequency: 20 * Math.PI, depth: 0.1, width: 0.5 } as const;
    expect(filterText(notch, 'Hz')).toBe('at 10.00 Hz, depth 0.10, width 0.50');
    expect(filterText(notch, 'rad/s')).toBe('at 62.83 rad/s, depth 0.10, width 0.50');
  });
});
