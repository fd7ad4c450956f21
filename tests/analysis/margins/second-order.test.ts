import { describe, expect, it } from 'vitest';
import { coefficients, numbersOf } from '../support/cast';

/**
 * L = 1/(s(s + 2ζ)) closes to the standard second-order loop with ωn = 1.
 * ζ, phase margin °, Mt, bandwidth, Ms: computed independently at 30 digits from the closed forms.
 */
const TABLE = [
  [0.1, 11.42061909, 5.025189076, 1.542771159, 5.12277358],
  [0.2, 22.60228412, 2.551551815, 1.5095771, 2.733921111],
  [0.3, 33.27249096, 1.747141395, 1.453689462, 1.994608004],
  [0.4, 43.11759796, 1.363861814, 1.374517121, 1.655046982],
  [0.5, 51.82729237, 1.154700538, 1.27201965, 1.467889825],
  [0.6, 59.18726681, 1.041666667, 1.148242308, 1.352757993],
  [0.7, 65.15639347, 1.00020006, 1.010049494, 1.276442467],
  [0.8, 69.8599989, 1, 0.870896319, 1.223030095],
];

describe.each(TABLE)('a second-order loop with damping %d', (...row) => {
  const [damping, phase, mt, bandwidth, ms] = row;
  const { margins, sensitivity, bandwidth: found, closedLoop } = numbersOf(coefficients([1], [1, 2 * damping, 0]));

  it('has the phase margin, peaks and bandwidth of the closed forms', () => {
    expect(margins.phase!.degrees).toBeCloseTo(phase, 7);
    expect(sensitivity.mt.value).toBeCloseTo(mt, 8);
    expect(found.closedLoop).toBeCloseTo(bandwidth, 8);
    expect(sensitivity.ms.value).toBeCloseTo(ms, 8);
  });

  it('peaks where the closed forms say', () => {
    const x = (1 + Math.sqrt(1 + 8 * damping * damping)) / 2;
    expect(sensitivity.ms.frequency).toBeCloseTo(Math.sqrt(x), 10);
    const resonance = 1 - 2 * damping * damping;
    expect(sensitivity.mt.frequency).toBeCloseTo(resonance > 0 ? Math.sqrt(resonance) : 0, 10);
  });

  it('has its poles where the damping says', () => {
    closedLoop.poles!.forEach(({ re, im }) => {
      expect(re).toBeCloseTo(-damping, 14);
      expect(Math.abs(im)).toBeCloseTo(Math.sqrt(1 - damping * damping), 14);
    });
  });
});
