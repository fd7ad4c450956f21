import { describe, expect, it } from 'vitest';
import { edgesOf, headline, judgeCase } from '@/analysis/project';
import type { CaseAxes, Limit, OperatingRange } from '@/contract';
import { aResult, anAnalysis } from '../../support/an-analysis';

const range = (axis: OperatingRange['axis'], lowIsPhysical: boolean, highIsPhysical: boolean): OperatingRange => ({
  axis,
  engage: null,
  disengage: null,
  lowIsPhysical,
  highIsPhysical,
});
const at = (...axes: CaseAxes[]) => axes.map((place, index) => ({ id: String(index), axes: place }));

describe('the edge of what was checked', () => {
  const cases = at({ speed: 8, mass: 1380 }, { speed: 20, mass: 1500 }, { speed: 30, mass: 1640 }, {});

  it('is each end of each axis by itself', () => {
    expect(edgesOf('0', { cases, operatingRange: [range('speed', true, false)] })).toEqual([
      { axis: 'speed', end: 'low', physical: true },
      { axis: 'mass', end: 'low', physical: false },
    ]);
    expect(edgesOf('2', { cases, operatingRange: [range('speed', true, false)] })).toEqual([
      { axis: 'speed', end: 'high', physical: false },
      { axis: 'mass', end: 'high', physical: false },
    ]);
  });

  it('is not inside the grid, nor for a case without a place on it', () => {
    expect(edgesOf('1', { cases, operatingRange: [] })).toEqual([]);
    expect(edgesOf('3', { cases, operatingRange: [] })).toEqual([]);
  });

  it('is not on an axis along which only one value was checked', () => {
    expect(edgesOf('0', { cases: at({ speed: 8 }, { speed: 8 }), operatingRange: [] })).toEqual([]);
  });
});

describe('a headline at the edge', () => {
  const limits: Limit[] = [{ quantity: 'ms', bound: 'max', limit: 1.7, target: 1.6, source: '' }];
  const names = ['a', 'bb', 'ccc'];
  const results = (peaks: number[]) =>
    peaks.map((ms, index) => {
      const numbers = anAnalysis({ ms });
      return aResult(names[index], numbers, judgeCase(limits, numbers, { sampling: true, deadTime: true }));
    });
  const judged = (peaks: number[], operatingRange: OperatingRange[] = []) => {
    const all = results(peaks);
    return headline(all, { cases: all.map(({ case: { id } }, index) => ({ id, axes: { speed: 10 * (index + 1) } })), operatingRange });
  };

  it('is capped at tight until that end is declared physical', () => {
    expect(judged([1.5, 1.4, 1.3])).toMatchObject({ verdict: 'tight', capped: true, beside: null });
    expect(judged([1.5, 1.4, 1.3], [range('speed', false, true)])).toMatchObject({ verdict: 'tight', capped: true });
    expect(judged([1.5, 1.4, 1.3], [range('speed', true, false)])).toMatchObject({ verdict: 'pass', capped: false });
  });

  it('is not capped where the worst case lies inside, or where several are equally bad and one of them does', () => {
    expect(judged([1.4, 1.5, 1.3])).toMatchObject({ verdict: 'pass', edges: [] });
    expect(judged([1.5, 1.5, 1.5])).toMatchObject({ verdict: 'pass', case: { name: 'bb' } });
  });

  it('stays what it is where it is worse than tight already', () => {
    expect(judged([1.9, 1.4, 1.3])).toMatchObject({ verdict: 'fail', capped: false, edges: [{ end: 'low' }] });
  });
});
