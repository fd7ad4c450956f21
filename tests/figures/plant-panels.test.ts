import { describe, expect, it } from 'vitest';
import { plantResponse } from '@/analysis';
import { frequencyAxis, plantMagnitudePanel, plantPhasePanel, plantWindow } from '@/figures';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const plot = { x: 44, y: 18, width: 350, height: 160 };
const scene = { ...plantResponse({ kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 }), units };

describe('the sheet of a plant', () => {
  it('reaches from below its slowest to above its fastest corner, on 1, 2 or 5 of the reader’s unit', () => {
    const [low, high] = plantWindow([1 / 0.35, 12.5], 'rad/s');
    expect([low, high]).toEqual([0.5, 100]);
    const inHertz = plantWindow([1 / 0.35, 12.5], 'Hz').map((frequency) => frequency / (2 * Math.PI));
    expect(inHertz[0]).toBeCloseTo(0.05, 12);
    expect(inHertz[1]).toBeCloseTo(10, 12);
  });

  it('keeps the fast end of a plant that is wider than six decades', () => {
    const [low, high] = plantWindow([1e-9, 1e3], 'rad/s');
    expect(Math.log10(high / low)).toBeLessThan(7);
    expect(high).toBeGreaterThanOrEqual(5e3);
  });

  it('names what it shows, with its reference lines, and has no margins', () => {
    const across = frequencyAxis(plantWindow(scene.corners, 'rad/s'), [plot.x, plot.x + plot.width], 'rad/s');
    const magnitude = plantMagnitudePanel(scene, across, plot);
    const phase = plantPhasePanel(scene, across, plot);
    expect([magnitude.title, phase.title]).toEqual(['|P|', 'arg P']);
    expect(magnitude.strong).toEqual([0]);
    expect(phase.strong).toContain(-180);
    for (const { bars, dots, labels, curves } of [magnitude, phase]) {
      expect([bars, dots, labels]).toEqual([[], [], []]);
      expect(curves.a).toMatch(/^M/);
    }
  });

  it('shows a plant whose unit makes it small, where it is', () => {
    const small = { ...plantResponse({ kind: 'coefficients', numerator: [2.1e-6], denominator: [0.35, 1, 0], deadTime: 0 }), units };
    const across = frequencyAxis(plantWindow(small.corners, 'rad/s'), [plot.x, plot.x + plot.width], 'rad/s');
    const { axis, curves, strong } = plantMagnitudePanel(small, across, plot);
    expect(axis.domain[1]).toBeLessThan(-90);
    expect(axis.domain[1] - axis.domain[0]).toBeLessThanOrEqual(130);
    expect(curves.a).toMatch(/^M/);
    expect(strong).toEqual([]);
  });
});
