import { describe, expect, it } from 'vitest';
import { ruleMarks } from '@/components/bench/over/gain-marks';

const slow = { id: 'slow', name: '30 km/h' };
const ms = (holds: number, breaks: number) => ({ holds, breaks, quantity: 'ms', limit: 1.7, case: slow }) as const;
const lost = (holds: number, breaks: number) => ({ holds, breaks, quantity: null, limit: null, case: slow });

describe('what a gain’s rule shows of limits', () => {
  it('is the stretch in which all hold, each end with its limit and case, and where a case goes unstable', () => {
    const down = { limit: null, instability: lost(0.19, 0.18) };
    const up = { limit: ms(1.2, 1.21), instability: lost(3.4, 3.5) };
    expect(ruleMarks({ down, up })).toEqual({
      stretch: { low: undefined, high: { value: 1.2, name: 'Ms', case: '30 km/h' } },
      unstable: { below: 0.18, above: 3.5 },
    });
  });

  it('claims no stretch where a limit is broken now', () => {
    const up = { limit: ms(1, 1), instability: lost(3.4, 3.5) };
    expect(ruleMarks({ down: { limit: ms(1, 1), instability: null }, up })).toEqual({
      stretch: undefined,
      unstable: { below: undefined, above: 3.5 },
    });
  });

  it('says nothing of what was not looked for yet', () => {
    expect(ruleMarks({ up: { limit: null, instability: null } })).toEqual({});
  });
});
