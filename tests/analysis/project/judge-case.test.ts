import { describe, expect, it } from 'vitest';
import { judgeCase } from '@/analysis/project';
import type { Limit, Quantity } from '@/contract';
import { anAnalysis } from '../../support/an-analysis';

const stated = { sampling: true, deadTime: true };
const least = (quantity: Quantity, limit: number, target: number | null): Limit => ({
  quantity,
  bound: 'min',
  limit,
  target,
  source: 'team rule',
});
const most = (quantity: Quantity, limit: number, target: number | null): Limit => ({
  quantity,
  bound: 'max',
  limit,
  target,
  source: 'team rule',
});
const phase = (degrees: number) => anAnalysis({ margins: { phase: { degrees, frequency: 2 } } });

describe('the verdict of one case', () => {
  it('is pass where every target is met, tight where a target is missed, fail where a limit is', () => {
    const limits = [least('phaseMargin', 45, 50), most('ms', 1.7, 1.6)];
    expect(judgeCase(limits, phase(52), stated).verdict).toBe('pass');
    expect(judgeCase(limits, phase(47), stated).verdict).toBe('tight');
    expect(judgeCase(limits, phase(44.9), stated).verdict).toBe('fail');
  });

  it('meets a limit and a target that it stands on exactly', () => {
    expect(judgeCase([least('phaseMargin', 45, 50)], phase(45), stated).verdict).toBe('tight');
    expect(judgeCase([least('phaseMargin', 45, 50)], phase(50), stated).verdict).toBe('pass');
  });

  it('has no tight without a target', () => {
    const overshooting = (overshootPercent: number) => anAnalysis({ metrics: { overshootPercent } });
    expect(judgeCase([most('overshootPercent', 5, null)], overshooting(4.999), stated).verdict).toBe('pass');
    expect(judgeCase([most('overshootPercent', 5, null)], overshooting(5.001), stated).verdict).toBe('fail');
  });

  it('judges against the default target where none is named', () => {
    expect(judgeCase([most('ms', 1.6, null)], anAnalysis({ ms: 1.499 }), stated).verdict).toBe('pass');
    expect(judgeCase([most('ms', 1.6, null)], anAnalysis({ ms: 1.501 }), stated)).toMatchObject({
      verdict: 'tight',
      checks: [{ limit: 1.6, target: 1.5 }],
    });
  });

  it('is not judged without limits', () => {
    expect(judgeCase([], anAnalysis(), stated)).toEqual({ verdict: 'notJudged', reason: 'No limits are set.', checks: [] });
  });

  it('is not judged where nobody stated the sample time or the dead time, even where a limit is broken', () => {
    const limits = [least('phaseMargin', 45, 50)];
    const unsampled = judgeCase(limits, phase(20), { sampling: false, deadTime: true });
    expect(unsampled).toMatchObject({ verdict: 'notJudged', reason: 'Nobody stated the sample time.' });
    expect(unsampled.checks[0].verdict).toBe('fail');
    const undelayed = judgeCase(limits, phase(52), { sampling: true, deadTime: false });
    expect(undelayed.reason).toBe('Nobody stated where the dead time comes from.');
    // What holds is never green there.
    expect(undelayed.checks[0].verdict).toBe('notJudged');
  });

  it('gives every reason there is', () => {
    const { reason } = judgeCase([], anAnalysis(), { sampling: false, deadTime: false });
    expect(reason).toBe('Nobody stated the sample time. Nobody stated where the dead time comes from. No limits are set.');
  });

  it('fails an unstable loop before anything, and gives its numbers no use', () => {
    const unstable = anAnalysis({ stable: false, margins: { phase: { degrees: 80, frequency: 2 } } });
    const judged = judgeCase([least('phaseMargin', 45, 50)], unstable, { sampling: false, deadTime: false });
    expect(judged).toMatchObject({ verdict: 'fail', reason: null, checks: [{ value: 80, use: null, verdict: 'fail' }] });
    expect(judgeCase([], unstable, stated).verdict).toBe('fail');
  });

  it('takes a missing finite limit of a stable loop as met', () => {
    const endless = anAnalysis({ margins: { gain: null, gainReduction: null, phase: null, delay: null } });
    const limits = [
      least('gainMargin', 2, null),
      most('gainReduction', 0.5, null),
      least('phaseMargin', 45, 50),
      least('delayMargin', 0.1, null),
    ];
    const judged = judgeCase(limits, endless, stated);
    expect(judged.verdict).toBe('pass');
    expect(judged.checks.map(({ value, use }) => [value, use])).toEqual(limits.map(() => [null, null]));
  });

  it('does not judge any other quantity that could not be computed, and names it', () => {
    const judged = judgeCase([least('phaseMargin', 40, 45), most('settlingTime', 3, null)], anAnalysis(), stated);
    expect(judged).toMatchObject({ verdict: 'notJudged', reason: 'Could not be computed: settlingTime.' });
  });

  it('judges a phase margin and a steady-state error by magnitude', () => {
    expect(judgeCase([least('phaseMargin', 45, 50)], phase(-52), stated).verdict).toBe('pass');
    const drifting = anAnalysis({ metrics: { steadyStateError: -0.2 } });
    expect(judgeCase([most('steadyStateError', 0.1, null)], drifting, stated).verdict).toBe('fail');
  });
});
