import { describe, expect, it } from 'vitest';
import { frequencyWindow } from '@/figures/frequency-window';
import { responseOf } from '@/figures/loop-picture';
import { nicholsWindow } from '@/figures/nichols-window';
import { nyquistView, nyquistWindow } from '@/figures/nyquist-window';
import { oddHalfTurns } from '@/figures/loop-axes';
import { hugeGain, integrating, neverCrosses, unstablePlant } from '../support/chart-designs';

const plot = { x: 6, y: 48, width: 460, height: 330 };
const designs = { integrating, unstablePlant, hugeGain, neverCrosses };

describe.each(Object.entries(designs))('the windows of a loop: %s', (_, make) => {
  const { analysis } = make();

  it('the frequencies hold every gain crossover and the peak of |S|, ending on 1, 2 or 5', () => {
    const [low, high] = frequencyWindow([analysis], 'rad/s');
    analysis.margins.gainCrossovers.forEach(({ frequency }) => {
      expect(frequency).toBeGreaterThan(low);
      expect(frequency).toBeLessThan(high);
    });
    for (const end of [low, high]) expect(['1', '2', '5']).toContain(end.toExponential(0)[0]);
    expect(Math.log10(high / low)).toBeGreaterThan(1);
  });

  it('Nyquist holds −1 and the origin, with one scale both ways', () => {
    const view = nyquistView(nyquistWindow([analysis]), plot);
    for (const re of [-1, 0]) {
      const { x, y } = view.toPixel(re, 0);
      expect(x > plot.x && x < plot.x + plot.width && y > plot.y && y < plot.y + plot.height).toBe(true);
    }
    expect(view.toX(1) - view.toX(0)).toBeCloseTo(view.toY(0) - view.toY(1), 9);
  });

  it('Nichols holds a −1', () => {
    expect(oddHalfTurns(nicholsWindow([responseOf({ analysis })]).phaseDegrees).length).toBeGreaterThan(0);
  });
});

describe('the window of an unstable plant', () => {
  it('shows the turn that L takes round −1', () => {
    const { analysis } = unstablePlant();
    const furthest = Math.max(...analysis.margins.phaseCrossovers.map((c) => 1 / c.gainMarginFactor));
    expect(furthest).toBeGreaterThan(2);
    expect(nyquistWindow([analysis]).real[0]).toBeLessThan(-furthest);
  });
});

describe('a window in hertz', () => {
  it('ends on 1, 2 or 5 hertz', () => {
    const ends = frequencyWindow([integrating().analysis], 'Hz').map((end) => Number((end / (2 * Math.PI)).toPrecision(6)));
    for (const end of ends) expect(['1', '2', '5']).toContain(end.toExponential(0)[0]);
  });
});
