import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gainRule } from '@/figures/gain-rule';
import { draggedGain, gainMode, gainScale, linearSpanOf, nudgedGain } from '@/figures/gain-scale';
import { textWidth } from '@/figures/text-width';

const base = { value: 1.05, width: 366, mode: 'log', span: 3.2, linearSpan: 4 } as const;

describe('the scale of a gain rule', () => {
  it('is logarithmic for a positive gain, linear where it or the kept one is 0 or negative', () => {
    expect(gainMode(1, 0.5)).toBe('log');
    expect(gainMode(0, 0.5)).toBe('linear');
    expect(gainMode(1, 0)).toBe('linear');
    expect(linearSpanOf(0, null, 2)).toBe(2);
  });

  it('has the gain under the needle', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e6, noNaN: true }), fc.constantFrom('log' as const, 'linear' as const), (value, mode) => {
        expect(gainScale({ ...base, value, mode }).at(value)).toBeCloseTo(183, 6);
      }),
    );
  });

  it('follows the finger: what lay left comes under the needle when the scale is drawn right', () => {
    const { invert } = gainScale(base);
    expect(draggedGain(base, 50)).toBeCloseTo(invert(183 - 50), 2);
    expect(draggedGain(base, 50)).toBeLessThan(1.05);
    expect(Math.abs(draggedGain(base, 50, true) - 1.05)).toBeLessThan(0.03);
  });

  it('meets zero exactly on its way through it', () => {
    const linear = { ...base, value: -0.05, mode: 'linear', linearSpan: 0.2 } as const;
    const values = Array.from({ length: 200 }, (_, i) => draggedGain(linear, -i));
    expect(values).toContain(0);
  });

  it.each([
    [0.01, 1.0605],
    [-0.1, 0.945],
    [0.001, 1.051],
  ])('a nudge of %f gives %f', (fraction, value) => expect(nudgedGain(base, fraction)).toBeCloseTo(value, 2));
});

describe('the names on a gain rule', () => {
  it('never touch each other, the needle or the ends', () => {
    const kinds = fc.constantFrom('log' as const, 'linear' as const);
    fc.assert(
      fc.property(fc.double({ min: 1e-5, max: 1e5, noNaN: true }), kinds, fc.integer({ min: 180, max: 500 }), (value, mode, width) => {
        const { labels } = gainRule({ value, mode, width, span: 4, linearSpan: 4 * value, kept: null });
        labels.forEach(({ x }) => {
          expect(Math.abs(x - width / 2)).toBeGreaterThan(14);
          expect(x).toBeGreaterThan(10);
          expect(x).toBeLessThan(width - 10);
        });
        labels.slice(1).forEach((label, i) => {
          expect(label.x - labels[i].x).toBeGreaterThan((textWidth(label.text) + textWidth(labels[i].text)) / 2);
        });
      }),
    );
  });

  it('are the integers round the gain, and 1.5', () => {
    expect(gainRule({ ...base, kept: 1 }).labels.map(({ text }) => text)).toEqual(['0.7', '0.8', '0.9', '1', '1.5']);
  });
});

describe('limits on a gain rule', () => {
  const where = { case: '30 km/h, 1,380 kg' };
  const stretch = { low: { value: 0.95, name: 'Overshoot', ...where }, high: { value: 1.14, name: 'Ms', ...where } };

  it('bound the stretch in which all of them hold', () => {
    const shape = gainRule({ ...base, kept: 1, stretch });
    const { at } = gainScale(base);
    expect(shape.held).toEqual([at(0.95), at(1.14)]);
    expect(shape.edges.map(({ tick }) => tick)).toEqual([at(0.95), at(1.14)]);
  });

  it('are called by as much as there is room for, and never over each other', () => {
    const called = (width: number) => gainRule({ ...base, width, kept: 1, stretch }).edges.map(({ text }) => text);
    expect(called(600)).toEqual(['Overshoot, 30 km/h, 1,380 kg', 'Ms, 30 km/h, 1,380 kg']);
    expect(called(270)).toEqual(['Overshoot, 30 km/h', 'Ms, 30 km/h']);
    expect(called(140)).toEqual(['Overshoot', 'Ms']);
  });

  it('are not claimed where nobody looked', () => expect(gainRule({ ...base, kept: 1 }).held).toBeNull());

  it('stripe only what is unstable, and say in words what lies off the rule', () => {
    const shape = gainRule({ ...base, kept: 1, unstable: { below: 0.18, above: 1.6 } });
    expect(shape.kerbs).toHaveLength(1);
    expect(shape.warnings.map(({ text }) => text)).toEqual(['‹ unstable below 0.18', 'unstable from 1.6']);
  });
});
