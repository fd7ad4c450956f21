import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  formatDifference,
  formatFrequency,
  formatGain,
  formatMagnitude,
  formatNumber,
  formatRoomMilliseconds,
  formatRoomPercent,
  shortNumber,
  withUnit,
} from '@/figures/format';
import { quantityText } from '@/figures/quantity-text';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;

describe('formatNumber', () => {
  it.each([
    [-1380.25, 1, '\u22121,380.3'],
    [0, 1, '0.0'],
    [-0.04, 1, '0.0'],
    [1234567, 0, '1,234,567'],
    [2.5e12, 2, '2.50e12'],
    [NaN, 2, '–'],
    [-Infinity, 2, '\u2212∞'],
  ])('prints %f with %i decimals as %s', (value, decimals, text) => expect(formatNumber(value, decimals)).toBe(text));

  it('never prints a hyphen or a signed zero, and reads back as the rounded value', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e8, max: 1e8, noNaN: true }), fc.integer({ min: 0, max: 4 }), (value, decimals) => {
        const text = formatNumber(value, decimals);
        expect(text).not.toMatch(/-|^\u22120(\.0*)?$/);
        const read = Number(text.replace('\u2212', '-').replace(/,/g, ''));
        expect(Math.abs(read - value)).toBeLessThanOrEqual(0.5 * 10 ** -decimals * (1 + 1e-9));
      }),
    );
  });
});

describe('gains and frequencies', () => {
  it.each([
    [1.05, '1.05'],
    [0.3, '0.30'],
    [0.035, '0.035'],
    [0.01234, '0.0123'],
    [12.3456, '12.35'],
    [0, '0.00'],
    [-0.05, '\u22120.05'],
    [1.5e-8, '1.50e\u22128'],
  ])('a gain of %f is %s: three figures, two decimals at least, no idle zeros', (value, text) => expect(formatGain(value)).toBe(text));

  it('a frequency has two decimals, under 0.1 three figures, in the unit of the reader', () => {
    expect(formatFrequency(4.836, 'rad/s')).toBe('4.84');
    expect(formatFrequency(0.0192, 'rad/s')).toBe('0.0192');
    expect(formatFrequency(2 * Math.PI, 'Hz')).toBe('1.00');
    expect(formatFrequency(1234.56, 'rad/s')).toBe('1,234.6');
    expect(formatFrequency(600_000, 'rad/s')).toBe('600,000');
  });

  it('|L| is decibels to one decimal or a factor to two', () => {
    expect(formatMagnitude(2, 'dB')).toBe('6.0');
    expect(formatMagnitude(2, 'factor')).toBe('2.00');
  });

  it.each([
    [0.08, 2, '0.08'],
    [200, 1, '200'],
    [1.5, 2, '1.5'],
    [-0.08, 2, '\u22120.08'],
  ])('names the tick %f with at most %i figures as %s', (value, figures, text) => expect(shortNumber(value, figures)).toBe(text));
});

describe('room', () => {
  it('is rounded down, never up', () => {
    expect(formatRoomPercent(0.0799)).toBe('7 %');
    expect(formatRoomPercent(0.29)).toBe('29 %');
    expect(formatRoomMilliseconds(0.016999)).toBe('16 ms');
  });

  it('never claims more than there is', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 10, noNaN: true }), (fraction) => {
        expect(Number(formatRoomPercent(fraction).replace(/[, %]/g, ''))).toBeLessThanOrEqual(fraction * 100 * (1 + 1e-12));
      }),
    );
  });
});

describe('words round numbers', () => {
  it('a unit stands after a space, a degree does not', () => {
    expect(withUnit('53.3', '°')).toBe('53.3°');
    expect(withUnit('9.8', 'dB')).toBe('9.8 dB');
    expect(withUnit('1.63', '')).toBe('1.63');
  });

  it('a difference is that of the printed numbers', () => expect(formatDifference(1.625, 1.554, 2)).toBe('0.08'));

  it('a quantity brings its decimals and its unit', () => {
    expect(quantityText('ms', 1.5598, units).text).toBe('1.56');
    expect(quantityText('gainMargin', 11.681, units).text).toBe('21.3 dB');
    expect(quantityText('gainMargin', 11.681, { ...units, magnitude: 'factor' }).text).toBe('11.68');
    expect(quantityText('phaseMargin', 45.319, units).text).toBe('45.3°');
    expect(quantityText('delayMargin', 0.38416, units).text).toBe('0.38 s');
  });
});
