import { describe, expect, it } from 'vitest';
import { headline, judgeCase } from '@/analysis/project';
import type { Analysis, Limit } from '@/contract';
import { aResult, anAnalysis } from '../../support/an-analysis';

const stated = { sampling: true, deadTime: true };
const limits: Limit[] = [
  { quantity: 'phaseMargin', bound: 'min', limit: 45, target: 50, source: 'team rule' },
  { quantity: 'ms', bound: 'max', limit: 1.7, target: 1.6, source: 'team rule' },
  { quantity: 'settlingTime', bound: 'max', limit: 3, target: 2.7, source: 'team rule' },
];
const judged = (name: string, numbers: Analysis) => aResult(name, numbers, judgeCase(limits, numbers, stated));
const nowhere = { cases: [], operatingRange: [] };
const loop = (degrees: number, ms: number, settlingTime: number) =>
  anAnalysis({ margins: { phase: { degrees, frequency: 2.1 } }, ms, metrics: { settlingTime } });

describe('the headline', () => {
  it('is the worst Ms, not judged, where no limits are set', () => {
    const first = headline([aResult('dry', anAnalysis({ ms: 1.5 })), aResult('standing water', anAnalysis({ ms: 1.62 }))], nowhere);
    expect(first).toMatchObject({
      quantity: 'ms',
      value: 1.62,
      verdict: 'notJudged',
      case: { name: 'standing water' },
      limit: null,
      use: null,
    });
    expect(first).toMatchObject({ frequency: 2.9194, unstableCases: 0, reason: 'No limits are set.' });
  });

  it('is an unstable case before anything, without a number', () => {
    const results = [
      judged('dry', loop(20, 2.5, 2)),
      judged('ice', anAnalysis({ stable: false })),
      judged('gravel', anAnalysis({ stable: false, unstablePoles: 4 })),
    ];
    expect(headline(results, nowhere)).toEqual({
      quantity: 'ms',
      value: null,
      verdict: 'fail',
      case: results[2].case,
      frequency: null,
      limit: null,
      target: null,
      use: null,
      unstableCases: 2,
      reason: null,
      beside: null,
      edges: [],
      capped: false,
    });
  });

  it('is the failed stability quantity with the greatest use', () => {
    const first = headline([judged('dry', loop(44, 1.5, 2)), judged('wet track', loop(52, 1.9, 2))], nowhere);
    // Phase: (50 − 44)/5 = 1.2. Ms: (1/1.6 − 1/1.9)/(1/1.6 − 1/1.7) = 2.68.
    expect(first).toMatchObject({ quantity: 'ms', value: 1.9, limit: 1.7, verdict: 'fail', case: { name: 'wet track' } });
    expect(first.use).toBeCloseTo(2.684, 3);
  });

  it('keeps a failed performance quantity out of its place but carries its verdict', () => {
    const first = headline([judged('dry', loop(52, 1.5, 9))], nowhere);
    expect(first).toMatchObject({ quantity: 'phaseMargin', value: 52, frequency: 2.1, verdict: 'fail' });
    expect(first.use).toBeCloseTo(-0.4, 12);
  });

  it('is the stability quantity with the greatest use where all hold', () => {
    expect(headline([judged('dry', loop(47, 1.5, 2)), judged('wet', loop(60, 1.65, 2))], nowhere)).toMatchObject({
      quantity: 'phaseMargin',
      value: 47,
      verdict: 'tight',
    });
  });

  it('is Ms where only performance is demanded', () => {
    const fast: Limit[] = [{ quantity: 'settlingTime', bound: 'max', limit: 3, target: null, source: 'lap plan' }];
    const numbers = loop(52, 1.5, 2);
    expect(headline([aResult('dry', numbers, judgeCase(fast, numbers, stated))], nowhere)).toMatchObject({
      quantity: 'ms',
      value: 1.5,
      verdict: 'pass',
      reason: null,
    });
  });
});
