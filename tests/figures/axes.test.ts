import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { frequencyAxis } from '@/figures/frequency-axis';
import { magnitudeAxis, nearestOddHalfTurn, oddHalfTurns, phaseAxis } from '@/figures/loop-axes';
import { steadyInterval } from '@/figures/steady-interval';
import { textWidth } from '@/figures/text-width';
import { timeAxis } from '@/figures/time-axis';
import { valueAxis } from '@/figures/value-axis';

const decades = fc.tuple(fc.double({ min: -4, max: 4, noNaN: true }), fc.double({ min: 0.5, max: 8, noNaN: true }));

describe('frequencyAxis', () => {
  it('names 1, 2 and 5 and has a tick at every other integer, as a slide rule does', () => {
    const axis = frequencyAxis([0.2, 50], [44, 450], 'rad/s');
    expect(axis.labelled.map(({ text }) => text)).toEqual(['0.2', '0.5', '1', '2', '5', '10', '20', '50']);
    expect(axis.minor.map(({ frequency }) => Number(frequency.toFixed(6)))).toEqual([
      0.3, 0.4, 0.6, 0.7, 0.8, 0.9, 3, 4, 6, 7, 8, 9, 30, 40,
    ]);
  });

  it('has round labels in hertz too', () => {
    const axis = frequencyAxis([2 * Math.PI * 0.1, 2 * Math.PI * 10], [44, 450], 'Hz');
    expect(axis.labelled.map(({ text }) => text)).toEqual(['0.1', '0.2', '0.5', '1', '2', '5', '10']);
  });

  it('never lets labels touch, whatever the span and the width, and inverts its own scale', () => {
    fc.assert(
      fc.property(decades, fc.integer({ min: 240, max: 900 }), ([start, span], width) => {
        const axis = frequencyAxis([10 ** start, 10 ** (start + span)], [44, 44 + width], 'rad/s');
        axis.labelled.slice(1).forEach((label, i) => {
          const half = (textWidth(label.text ?? '') + textWidth(axis.labelled[i].text ?? '')) / 2;
          expect(label.x - axis.labelled[i].x).toBeGreaterThan(half);
        });
        expect(axis.invert(axis.at(10 ** (start + span / 3))) / 10 ** (start + span / 3)).toBeCloseTo(1, 9);
      }),
    );
  });
});

describe('upright axes', () => {
  it('the decibel axis holds 0 dB and does not follow |L| beyond 60 dB', () => {
    const axis = magnitudeAxis([-250, 10, 190], [150, 0], 'dB');
    expect(axis.domain).toEqual([-60, 60]);
    expect(axis.ticks.map(({ value }) => value)).toContain(0);
  });

  it('the same axis in factors is named by factors', () => {
    const axis = magnitudeAxis([-40, 40], [150, 0], 'factor');
    expect(axis.ticks.map(({ text }) => text)).toEqual(['0.01', '0.1', '1', '10', '100']);
  });

  it('the phase axis always holds an odd half turn', () => {
    fc.assert(
      fc.property(fc.double({ min: -2000, max: 400, noNaN: true }), fc.double({ min: 0, max: 3000, noNaN: true }), (high, fall) => {
        expect(oddHalfTurns(phaseAxis([high, high - fall], [140, 0]).domain).length).toBeGreaterThan(0);
      }),
    );
  });

  it.each([
    [-126, -180],
    [-400, -540],
    [20, 180],
    [-1, -180],
  ])('the half turn nearest %f° is %f°', (degrees, turn) => expect(nearestOddHalfTurn(degrees)).toBe(turn));

  it('a value axis starts at zero where the curve does and leaves air above it', () => {
    const axis = valueAxis([0, 1.2], [150, 0]);
    expect(axis.domain[0]).toBe(0);
    expect(axis.at(1.2)).toBeGreaterThan(8);
    expect(axis.ticks.map(({ text }) => text)).toEqual(['0.0', '0.5', '1.0']);
  });

  it('a flat curve gets an axis of its own', () => expect(valueAxis([0, 0], [100, 0]).ticks.length).toBeGreaterThan(1));
});

describe('timeAxis', () => {
  it('names every second tick, the last with its unit', () => {
    const { ticks } = timeAxis(8, [44, 384]);
    expect(ticks.filter(({ text }) => text !== null).map(({ text }) => text)).toEqual(['0', '2', '4', '6', '8 s']);
    expect(ticks.filter(({ text }) => text === null)).toHaveLength(4);
  });
});

describe('steadyInterval', () => {
  it('stands still while the wanted interval lies inside and fills most of it', () => {
    expect(steadyInterval([0.2, 50], [0.3, 40], Math.log10)).toEqual([0.2, 50]);
    expect(steadyInterval([0.2, 50], [0.1, 40], Math.log10)).toEqual([0.1, 40]);
    expect(steadyInterval([0.001, 500], [0.2, 50], Math.log10)).toEqual([0.2, 50]);
  });
});
