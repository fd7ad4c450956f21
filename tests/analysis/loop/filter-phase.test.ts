import { describe, expect, it } from 'vitest';
import { buildLoop, filterPhaseDegrees, loopAt } from '@/analysis';
import { type Filter, Loop } from '@/contract';

const plant = { kind: 'coefficients', numerator: [2], denominator: [1, 1], deadTime: 0.01 };
const loopWith = (filters: Filter[]) =>
  loopAt(buildLoop(Loop.parse({ plant, controller: { form: 'parallel', kp: 1, ki: 1, kd: 0, filters } })));

const cases: Filter[] = [
  { kind: 'lowPass', timeConstant: 0.1 },
  { kind: 'lowPass', timeConstant: 0 },
  { kind: 'notch', frequency: 12, depth: 0.1, width: 0.5 },
  { kind: 'notch', frequency: 12, depth: 0, width: 0.2 },
  { kind: 'notch', frequency: 12, depth: 1, width: 0.2 },
  { kind: 'leadLag', zeroTime: 0.2, poleTime: 0.02 },
  { kind: 'leadLag', zeroTime: 0.02, poleTime: 0.2 },
];

describe('the phase of a filter', () => {
  it.each(cases)('is what it adds to the loop: %o', (filter) => {
    const [without, withFilter] = [loopWith([]), loopWith([filter])];
    for (const frequency of [0.3, 5, 11.9, 12.1, 90])
      expect(filterPhaseDegrees(filter, frequency)).toBeCloseTo(withFilter(frequency).phaseDegrees - without(frequency).phaseDegrees, 8);
  });

  it('of a lag is −45° at its corner', () => expect(filterPhaseDegrees({ kind: 'lowPass', timeConstant: 0.1 }, 10)).toBeCloseTo(-45, 12));
});
