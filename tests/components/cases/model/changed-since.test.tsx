import { describe, expect, it } from 'vitest';
import { changeText } from '@/components/cases/changed-banner';
import { changedSince } from '@/components/cases/model/changed-since';
import { sameContent } from '@/components/cases/model/same-content';
import { aCase, conditionsOf, frozen, limits, sixCases } from '../cases-harness';

const then = conditionsOf(sixCases);

describe('what changed since an analysis was kept', () => {
  it('is nothing where everything stands as it did, whatever the order of fields', () => {
    const again = JSON.parse(JSON.stringify(then)) as typeof then;
    const turned = again.cases.map((one) => Object.fromEntries(Object.entries(one).reverse()) as unknown as typeof one);
    expect(changedSince(then, { ...again, cases: turned })).toEqual([]);
  });

  it.each([
    ['a case more', [...sixCases, aCase(99)]],
    ['a case less', sixCases.slice(1)],
    ['another dead time', [{ ...sixCases[0], parameters: { deadTime: 0.2 } }, ...sixCases.slice(1)]],
    ['another name', [{ ...sixCases[0], name: 'slow' }, ...sixCases.slice(1)]],
    ['another case in its place', [aCase(99), ...sixCases.slice(1)]],
  ])('is the cases: %s', (_what, cases) => {
    expect(changedSince(then, conditionsOf(cases))).toEqual(['cases']);
  });

  it('is the plant where that has another revision', () => {
    expect(changedSince(then, { ...then, cases: sixCases.map((one) => frozen(one, 4)) })).toEqual(['plants']);
  });

  it('is limits and declared edges', () => {
    const range = { axis: 'speed' as const, engage: null, disengage: 8, lowIsPhysical: true, highIsPhysical: false };
    expect(changedSince(then, { ...then, limits: limits.slice(1), operatingRange: [range] })).toEqual(['limits', 'operatingRange']);
  });

  it('is said in one sentence', () => {
    expect(changeText(['cases', 'limits'], 7)).toBe('Cases and limits changed since rev 7 was analysed.');
    expect(changeText(['plants'], 7)).toBe('The plant changed since rev 7 was analysed.');
  });
});

describe('two JSON values', () => {
  it.each([
    [{ a: 1, b: [1, { c: null }] }, { b: [1, { c: null }], a: 1 }, true],
    [{ a: 1 }, { a: 1, b: undefined }, true],
    [{ a: null }, {}, false],
    [[1, 2], [2, 1], false],
    [[], {}, false],
    ['1', 1, false],
  ])('%j and %j hold the same: %s', (a, b, same) => {
    expect(sameContent(a, b)).toBe(same);
  });
});
