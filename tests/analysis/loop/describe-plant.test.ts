import { describe, expect, it } from 'vitest';
import { describePlant } from '@/analysis';
import { coefficients, loopOf, roots } from '../support/cast';

const wordsOf = (plant: Parameters<typeof loopOf>[0]) => describePlant(loopOf(plant).plant).words;

describe('a plant in words', () => {
  it.each([
    [
      coefficients([2.1], [0.35, 1, 0], 0.08),
      'Integrator, gain 2.1; lag of 0.35 s; dead time 0.08 s. By itself it does not settle: it integrates.',
    ],
    [coefficients([4], [1, 0.4, 4]), 'Static gain 1; mode at 2 rad/s, damping 0.1. It is stable by itself.'],
    [
      coefficients([-1, 2], [1, 2, 1]),
      'Static gain 2; lag of 1 s (2 times); inverse response (right-half-plane zero) of 0.5 s. It is stable by itself.',
    ],
    [coefficients([3], [2, -1]), 'Static gain −3; unstable pole, growing with 2 s. It is unstable by itself.'],
    [roots(9, { poles: [[0, 3]] }), 'Static gain 1; mode at 3 rad/s, undamped. By itself it oscillates without end.'], // prettier-ignore
  ])('%#', (plant, words) => expect(wordsOf(plant)).toBe(words));

  it('comes back factored and expanded', () => {
    const { gain, zeros, poles, numerator, denominator, deadTime } = describePlant(loopOf(roots(6, { poles: [[0, 0], [-2, 0]] }, 0.1)).plant); // prettier-ignore
    expect({ gain, zeros, numerator, denominator, deadTime }).toEqual({
      gain: 6,
      zeros: [],
      numerator: [6],
      denominator: [1, 2, 0],
      deadTime: 0.1,
    });
    expect(poles.map(({ re }) => re)).toEqual([0, -2]);
  });
});
