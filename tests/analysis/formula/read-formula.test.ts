import { describe, expect, it } from 'vitest';
import { LoopError } from '@/analysis';
import { describeFormula, readFormula, resolvePlant } from '@/analysis/formula';

const refusalOf = (text: string, parameters: Record<string, number> = {}) => {
  try {
    readFormula(text, parameters);
  } catch (error) {
    if (error instanceof LoopError) return `${error.pointer} ${error.detail}`;
    throw error;
  }
  return 'accepted';
};

describe('a formula is read', () => {
  it.each([
    ['2.1*exp(-0.08*s)/(s*(0.35*s+1))'],
    ['2.1 exp(-0.08 s)/(s (0.35 s + 1))'],
    ['2.1 e^(-0.08 s) / (0.35 s^2 + s)'],
    ['exp(-0.08 s) (2.1/s) / (1 + 0.35 s)'],
    ['k exp(-s theta)/(s (T s + 1))'],
  ])('%s', (text) => {
    const { rational, deadTime } = readFormula(text, { k: 2.1, theta: 0.08, T: 0.35 });
    expect(deadTime).toBeCloseTo(0.08, 15);
    expect(rational.gain).toBeCloseTo(6, 12);
    expect(rational.zeros).toEqual([]);
    expect(rational.poles.map(({ re }) => re).sort((a, b) => b - a)).toEqual([0, expect.closeTo(-1 / 0.35, 12)]);
  });

  it('keeps factors that lie close together exact: they are never expanded', () => {
    const { rational } = readFormula('1/((s+1)(s+1.000001)(s+1.000002)(s+1.000003))', {});
    expect(rational.poles.map(({ re }) => re)).toEqual([-1, -1.000001, -1.000002, -1.000003]);
    expect(rational.coefficients).toBeUndefined();
  });

  it('adds fractions over their common denominator once', () => {
    const { rational } = readFormula('1/(s+1) + 2/(s+1) - 1/(s+2)', {});
    expect(rational.poles.map(({ re }) => re)).toEqual([-1, -2]);
    expect(rational.gain).toBe(2);
    expect(rational.zeros.map(({ re }) => re)).toEqual([-2.5]);
  });

  it('applies a power after an implied product to the bracket alone', () => {
    expect(readFormula('1/(s (s+2)^2)', {}).rational.poles.map(({ re }) => re)).toEqual([0, -2, -2]);
  });

  it('becomes a plant by coefficients where it is one polynomial over another, by roots where it is a product', () => {
    expect(resolvePlant({ kind: 'formula', text: '3/(s^2+2 s+5)', parameters: {} })).toEqual({
      kind: 'coefficients',
      numerator: [3],
      denominator: [1, 2, 5],
      deadTime: 0,
    });
    expect(resolvePlant({ kind: 'formula', text: '3/((s+1)(s+2))', parameters: {} }).kind).toBe('roots');
  });

  it('is read back in words', () => {
    const { words } = describeFormula({ kind: 'formula', text: '2.1 exp(-0.08 s)/(s (0.35 s + 1))', parameters: {} });
    expect(words).toBe('Integrator, gain 2.1; lag of 0.35 s; dead time 0.08 s. By itself it does not settle: it integrates.');
  });
});

describe('a formula is refused, with the place and the reason', () => {
  it.each([
    ['1/(s+1', /^\/plant\/text A bracket is open at character 3/],
    ['1/(s + tau)', /Character 8: “tau” is neither s nor a parameter/],
    ['1/(s + 1) + exp(-s)/(s + 2)', /Character 11: Parts with different dead times/],
    ['exp(-s^2)/(s+1)', /Character 1: Dead time is exp of a number times s/],
    ['exp(s)/(s+1)', /Character 1: exp of a positive multiple/],
    ['(s^2+1)/(s+1)', /higher power of s than the denominator/],
    ['sin(s)/(s+1)', /Character 1: “sin” is neither/],
    ['1/(s^0.5+1)', /Character 5: A power is a whole number/],
    ['1/(s^25+1)', /A power is a whole number of at most 24/],
    ['((s+1)^24/(s+2)^24)^24', /No power of s above 24/],
    ['1/(s-s)', /Character 2: This divides by zero/],
    ['s - s', /The plant is zero/],
    ['[1,2]/s', /Only sums, products/],
    ['a = 1/s', /Only sums, products/],
    ['f(x) = 1/s', /Only sums, products/],
    ['"text"/s', /Only/],
    ['s > 1', /has no meaning|Only/],
    ['import("fs")', /Character 1|Only/],
    ['1/s; 2', /Only sums, products/],
    ['1e400/s', /no finite number/],
    ['exp(-20000 s)/s', /Dead time is at most/],
    [`1/(${'s+'.repeat(250)}1)`, /at most 500 characters/],
  ])('%s', (text, reason) => expect(refusalOf(text)).toMatch(reason));

  it('does not let a parameter be called s', () => expect(refusalOf('1/(s+1)', { s: 2 })).toMatch(/^\/plant\/parameters\/s/));

  it('points at the second use where the second use is wrong', () => expect(refusalOf('1/(s+1) + 1/(s+1)^1.5')).toMatch(/Character 18:/));
});
