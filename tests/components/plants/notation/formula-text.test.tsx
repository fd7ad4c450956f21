import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { resolvePlant } from '@/analysis/formula';
import { formulaNames } from '@/components/plants/notation/formula-names';
import { formulaText } from '@/components/plants/notation/formula-text';

const real = (re: number) => ({ re, im: 0 });
const pair = (re: number, im: number) => [
  { re, im },
  { re, im: -im },
];
const roots = { kind: 'roots', gain: 6, zeros: [], poles: [real(0), real(-2)], deadTime: 0.08 } as const;

describe('a plant written as a formula', () => {
  it.each([
    [{ ...roots, zeros: [], poles: [real(0), real(-2)] }, '6 exp(-0.08 s)/(s (s + 2))'],
    [
      { ...roots, gain: -1, zeros: [real(3)], poles: [real(0), real(0), ...pair(-0.5, 2)], deadTime: 0 },
      '-1 (s - 3)/(s^2 (s^2 + s + 4.25))',
    ],
    [{ ...roots, zeros: [], poles: [...pair(0, 3)], deadTime: 0 }, '6/(s^2 + 9)'],
    [{ ...roots, zeros: [], poles: [real(-2), real(0), real(-2)], deadTime: 0 }, '6/((s + 2)^2 s)'],
    [{ ...roots, zeros: [], poles: [], deadTime: 0 }, '6'],
    [{ kind: 'coefficients' as const, numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 }, '2.1 exp(-0.08 s)/(0.35 s^2 + s)'],
    [{ kind: 'coefficients' as const, numerator: [-1, 0, 2], denominator: [1, 0, 0], deadTime: 0 }, '(-s^2 + 2)/(s^2)'],
    [{ kind: 'coefficients' as const, numerator: [3], denominator: [1], deadTime: 1e-7 }, '3 exp(-1e-7 s)'],
  ])('%j', (plant, text) => {
    expect(formulaText(plant)).toBe(text);
  });

  it('reads as the polynomials that it was written from', () => {
    const coefficient = fc.double({ min: -1e3, max: 1e3, noNaN: true }).map((value) => Number(value.toPrecision(9)));
    const leading = coefficient.filter((value) => value !== 0);
    const polynomial = (rest: number) => fc.tuple(leading, fc.array(coefficient, { minLength: rest, maxLength: rest })).map(([first, more]) => [first, ...more]); // prettier-ignore
    fc.assert(
      fc.property(polynomial(1), polynomial(3), fc.constantFrom(0, 0.08), (numerator, denominator, deadTime) => {
        const plant = { kind: 'coefficients' as const, numerator, denominator, deadTime };
        const read = resolvePlant({ kind: 'formula', text: formulaText(plant), parameters: {} });
        expect(read).toMatchObject({ kind: 'coefficients', deadTime });
        if (read.kind !== 'coefficients') return;
        const scale = numerator[0] / read.numerator[0];
        read.numerator.forEach((value, i) => expect(value * scale).toBeCloseTo(numerator[i], 9));
        read.denominator.forEach((value, i) => expect(value * scale).toBeCloseTo(denominator[i], 9));
      }),
      { seed: 7, numRuns: 60 },
    );
  });

  it('reads as the roots that it was written from', () => {
    const plant = {
      ...roots,
      zeros: [real(0.7)],
      poles: [real(0), real(-1 / 0.35), real(-2), real(-2), ...pair(-0.01, 3), ...pair(-0.01, 3)],
    };
    const read = resolvePlant({ kind: 'formula', text: formulaText(plant), parameters: {} });
    expect(read).toMatchObject({ kind: 'roots', gain: 6, deadTime: 0.08 });
    if (read.kind !== 'roots') return;
    for (const { re, im } of plant.poles) expect(read.poles.some((pole) => Math.hypot(pole.re - re, pole.im - im) < 1e-12)).toBe(true);
  });
});

describe('the named parameters of a formula', () => {
  it.each([
    ['2.1*exp(-0.08*s)/(s*(0.35*s+1))', []],
    ['k exp(-tau s)/(m s + 2e3 b + k)', ['k', 'tau', 'm', 'b']],
    ['k1 s/(2e^(-s) + pi 3x_2)', ['k1', 'x_2']],
  ])('%s', (text, names) => {
    expect(formulaNames(text)).toEqual(names);
  });
});
