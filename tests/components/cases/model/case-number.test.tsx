import { describe, expect, it } from 'vitest';
import { caseNumber } from '@/components/cases/model/case-number';
import { caseVerdict, whyNotJudged } from '@/components/cases/model/case-verdict';
import { caseViews } from '@/components/cases/model/case-view';
import { worstNumber } from '@/components/cases/model/worst-number';
import { aCase, conditionsOf, keptOf, limits, sixCases, sixNumbers, viewsOf, withMs } from '../cases-harness';
import { anAnalysis } from '../../../support/an-analysis';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const ms = (views: Parameters<typeof caseNumber>[0][]) => views.map((view) => caseNumber(view, 'ms', units));

describe('the number of a case', () => {
  it('has its digits, its verdict and its use', () => {
    const [first, second] = ms(viewsOf(sixCases, sixNumbers));
    expect(first).toMatchObject({ text: '1.63', verdict: 'tight' });
    expect(second).toMatchObject({ text: '1.51', verdict: 'pass' });
    expect(first.use).toBeGreaterThan(0);
  });

  it('is not judged, and keeps the digits of before, once the case runs otherwise', () => {
    const now = conditionsOf([{ ...sixCases[0], parameters: { gainFactor: 2 } }, ...sixCases.slice(1)]);
    const [view] = viewsOf(sixCases, sixNumbers, now);
    expect(caseNumber(view, 'ms', units)).toMatchObject({ text: '1.63', verdict: 'notJudged', use: null });
    expect(caseVerdict(view)).toBe('notJudged');
    expect(whyNotJudged(view)).toMatch(/Changed since/);
  });

  it('does not change with a name or a place', () => {
    const now = conditionsOf([{ ...sixCases[0], name: 'slow', axes: {} }, ...sixCases.slice(1)]);
    expect(caseNumber(viewsOf(sixCases, sixNumbers, now)[0], 'ms', units).verdict).toBe('tight');
  });

  it('of a case that nobody analysed is none', () => {
    const cases = [...sixCases, aCase(99)];
    const views = caseViews(cases, conditionsOf(cases), keptOf(sixCases, sixNumbers));
    expect(caseNumber(views[6], 'ms', units)).toMatchObject({ digits: '–', verdict: 'notJudged', value: null });
  });

  it('of an unstable loop has no meaning', () => {
    const [view] = viewsOf(sixCases.slice(0, 1), [anAnalysis({ stable: false })]);
    expect(caseNumber(view, 'ms', units)).toMatchObject({ text: 'unstable', verdict: 'fail', value: null });
  });

  it('says "no limit" where a margin is without end', () => {
    const [view] = viewsOf(sixCases.slice(0, 1), [anAnalysis({ margins: { gain: null } })]);
    expect(caseNumber(view, 'gainMargin', units)).toMatchObject({ text: 'no limit', verdict: null });
  });

  it('is never green where nobody stated the sample time', () => {
    const views = caseViews(sixCases, conditionsOf(sixCases), keptOf(sixCases, sixNumbers, { sampling: null }));
    expect(ms(views).map(({ verdict }) => verdict)).toEqual(Array(6).fill('notJudged'));
  });
});

describe('the case that is singled out', () => {
  it('is the one nearest its limit', () => {
    expect(worstNumber(ms(viewsOf(sixCases, sixNumbers)), 'ms')?.view.kept.name).toBe('30 km/h, 1380 kg');
  });

  it('is an unstable one before any', () => {
    const views = viewsOf(sixCases.slice(0, 2), [withMs(2), anAnalysis({ stable: false })]);
    expect(worstNumber(ms(views), 'ms')?.view).toBe(views[1]);
  });

  it('without a limit is the end at which one would stand: the greatest Mt, the least disk margin', () => {
    const views = viewsOf(sixCases.slice(0, 2), [
      anAnalysis({ margins: { disk: { alpha: 0.9, gainLow: 0.4, gainHigh: 2, phaseDegrees: 40 } } }),
      anAnalysis({ margins: { disk: { alpha: 0.7, gainLow: 0.4, gainHigh: 2, phaseDegrees: 40 } } }),
    ]);
    expect(limits.some(({ quantity }) => quantity === 'diskMargin')).toBe(false);
    const disk = views.map((view) => caseNumber(view, 'diskMargin', units));
    expect(worstNumber(disk, 'diskMargin')?.view).toBe(views[1]);
  });

  it('is nobody where a limit could stand at either end, or nothing was analysed', () => {
    const views = viewsOf(sixCases, sixNumbers);
    expect(
      worstNumber(
        views.map((view) => caseNumber(view, 'bandwidth', units)),
        'bandwidth',
      ),
    ).toBeNull();
    const unanalysed = caseViews(sixCases, conditionsOf(sixCases), null);
    expect(worstNumber(ms(unanalysed), 'ms')).toBeNull();
  });
});
