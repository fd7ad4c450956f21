import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contourPoint, legibleContours, nicholsContour, toNichols } from '@/figures/sensitivity-contours';

const level = fc.double({ min: 1.01, max: 20, noNaN: true });
const angle = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });

describe('contours of |S|', () => {
  it('lie where 1/|1 + L| is their level', () => {
    fc.assert(
      fc.property(level, angle, (s, a) => {
        const { re, im } = contourPoint(s, a);
        expect(1 / Math.hypot(1 + re, im)).toBeCloseTo(s, 9);
      }),
    );
  });

  it('are the same on Nichols, on every copy of −1', () => {
    fc.assert(
      fc.property(level, fc.constantFrom(0, -360, 360), (s, turn) => {
        nicholsContour(s, turn, (x, y) => ({ x, y })).forEach(({ x, y }) => {
          const magnitude = 10 ** (y / 20);
          const phase = ((x - turn) * Math.PI) / 180;
          expect(1 / Math.hypot(1 + magnitude * Math.cos(phase), magnitude * Math.sin(phase))).toBeCloseTo(s, 6);
        });
      }),
    );
  });

  it('put −1 at −180° and 0 dB', () => {
    const { phaseDegrees, decibels } = toNichols({ re: -1, im: -0 });
    expect(phaseDegrees).toBeCloseTo(-180, 12);
    expect(decibels).toBeCloseTo(0, 12);
  });

  it('are drawn only where they can be told apart', () => {
    expect(legibleContours([1.1, 1.2, 2, 3], 150, 5)).toEqual([1.1, 1.2, 2, 3]);
    expect(legibleContours([1.1, 1.2, 2, 3], 14, 5)).toEqual([1.1, 2]);
  });
});
