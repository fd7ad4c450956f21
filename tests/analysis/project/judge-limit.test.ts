import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { defaultTarget, judgeLimit, limitUse } from '@/analysis/project';
import type { Limit } from '@/contract';
import { anAnalysis } from '../../support/an-analysis';

const demand = (quantity: Limit['quantity'], bound: Limit['bound'], limit: number, target: number | null): Limit => ({
  quantity,
  bound,
  limit,
  target,
  source: '',
});
const peak = () => fc.double({ min: 1.0001, max: 20, noNaN: true });

/** Two peaks, the lesser one the target; and a peak that lies anywhere, also exactly on one of them. */
const peaks = fc
  .tuple(peak(), peak(), peak(), fc.constantFrom('anywhere', 'limit', 'target'))
  .map(([a, b, ms, place]) => ({ limit: Math.max(a, b), target: Math.min(a, b), ms, place }))
  .map(({ limit, target, ms, place }) => ({ limit, target, ms: place === 'limit' ? limit : place === 'target' ? target : ms }));

describe('a verdict', () => {
  it('is the same whether a demand is written as Ms or as modulus margin', () => {
    fc.assert(
      fc.property(peaks, ({ limit, target, ms }) => {
        const analysis = anAnalysis({ ms });
        const asPeak = judgeLimit(demand('ms', 'max', limit, target), analysis);
        const asMargin = judgeLimit(demand('modulusMargin', 'min', 1 / limit, 1 / target), analysis);
        expect(asMargin.verdict).toBe(asPeak.verdict);
        if (limit > target) expect(asMargin.use).toBe(asPeak.use);
      }),
    );
  });

  it('is the same whether a gain is shown and typed in decibels or as a factor', () => {
    const typed = fc.integer({ min: 1, max: 400 }).map((tenths) => tenths / 10);
    const value = fc.double({ min: 0.05, max: 45, noNaN: true });
    fc.assert(
      fc.property(typed, typed, value, (limit, inside, decibels) => {
        fc.pre(Math.abs(decibels - limit) > 1e-9 && Math.abs(decibels - limit - inside) > 1e-9);
        const analysis = anAnalysis({ margins: { gain: { factor: 10 ** (decibels / 20), decibels, frequency: 3 } } });
        const { verdict } = judgeLimit(demand('gainMargin', 'min', 10 ** (limit / 20), 10 ** ((limit + inside) / 20)), analysis);
        expect(verdict).toBe(decibels < limit ? 'fail' : decibels < limit + inside ? 'tight' : 'pass');
      }),
    );
  });

  it('agrees with its use: none left of the way is tight or better, more than all of it fails', () => {
    fc.assert(
      fc.property(peaks, ({ limit, target, ms }) => {
        fc.pre(limit > target);
        const { use, verdict } = judgeLimit(demand('ms', 'max', limit, target), anAnalysis({ ms }));
        if (use! > 1 + 1e-12) expect(verdict).toBe('fail');
        if (use! <= 0) expect(verdict).toBe('pass');
        if (verdict === 'tight') expect(use).toBeGreaterThan(0);
      }),
    );
  });
});

describe('the target that nobody named', () => {
  it.each([
    ['phaseMargin', 'min', 45, 50],
    ['gainMargin', 'min', 2, 2 * 10 ** 0.05],
    ['gainReduction', 'max', 0.5, 0.5 * 10 ** -0.05],
    ['ms', 'max', 1.7, 1.6],
    ['mt', 'max', 1.4, 1.3],
    ['modulusMargin', 'min', 0.6, 0.63],
    ['diskMargin', 'min', 0.7, 0.75],
    ['delayMargin', 'min', 0.2, 0.24],
    ['settlingTime', 'max', 6, 5.4],
    ['loadSettlingTime', 'max', 4, 3.6],
    ['riseTime', 'max', 1, 0.9],
    ['riseTime', 'min', 1, 1.1],
    ['noiseGain', 'max', 20, 18],
  ] as const)('of %s at %s %f is %f', (quantity, bound, limit, target) =>
    expect(defaultTarget({ quantity, bound, limit })).toBeCloseTo(target, 12),
  );

  it.each(['overshootPercent', 'undershootPercent', 'steadyStateError', 'loadPeak', 'controlPeak', 'bandwidth'] as const)(
    'is none for %s: such a check passes or fails',
    (quantity) => expect(defaultTarget({ quantity, bound: 'max', limit: 5 })).toBeNull(),
  );

  it('a target on the limit itself leaves a ruler as if there were none', () => {
    expect(limitUse(demand('overshootPercent', 'max', 5, 5), 4.75)).toBeCloseTo(0.5, 12);
  });
});
