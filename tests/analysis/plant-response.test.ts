import { describe, expect, it } from 'vitest';
import { LoopError, plantResponse } from '@/analysis';

const coefficients = (numerator: number[], denominator: number[], deadTime = 0) =>
  ({ kind: 'coefficients', numerator, denominator, deadTime }) as const;

describe('a plant by itself', () => {
  const { at, corners, curves } = plantResponse(coefficients([2.1], [0.35, 1, 0], 0.08));

  it('is exact at any frequency, dead time included', () => {
    // |2.1/(j(1 + 0.35j))| and −90° − atan(0.35) − 0.08 rad at 1 rad/s, by hand.
    expect(at(1).magnitude).toBeCloseTo(2.1 / Math.hypot(1, 0.35), 12);
    expect(at(1).phaseDegrees).toBeCloseTo(-90 - ((Math.atan(0.35) + 0.08) * 180) / Math.PI, 10);
  });

  it('has corners at its lag and its dead time', () => {
    expect(corners[0]).toBeCloseTo(1 / 0.35, 12);
    expect(corners[1]).toBeCloseTo(1 / 0.08, 12);
  });

  it('is drawn far beyond its corners on the grid of every curve', () => {
    const { frequencies, plant } = curves;
    expect(frequencies[0]).toBeLessThan(corners[0] / 50);
    expect(frequencies[frequencies.length - 1]).toBeGreaterThan(corners[1] * 50);
    const degreesApart = plant.phaseDegrees.slice(1).map((phase, i) => Math.abs(phase - plant.phaseDegrees[i]));
    expect(Math.max(...degreesApart)).toBeLessThanOrEqual(5);
  });

  it('can be drawn where a loop of gain 1 round it could not be closed', () => {
    expect(plantResponse(coefficients([-1], [1])).at(3)).toMatchObject({ magnitude: 1, phaseDegrees: -180 });
  });

  it('is refused where it has no meaning', () => {
    expect(() => plantResponse(coefficients([1, 0, 0], [1, 1]))).toThrow(LoopError);
  });
});
