import { describe, expect, it } from 'vitest';
import { buildLoop } from '@/analysis';
import { AxisProduct } from '@/analysis/loop/axis-product';
import { fromCoefficients } from '@/analysis/loop/rational';
import { expandRoots } from '@/analysis/numbers/polynomial';
import { polynomialRoots } from '@/analysis/numbers/polynomial-roots';
import { coefficients, frequencyNumbersOf, loopOf, numbersOf, pid, roots } from '../support/cast';

/** Each of these shows the naive way fail on a loop that the engine gets right: were both right, the test would prove nothing. */

describe('the greatest value on a grid', () => {
  const plant = roots(1, { poles: [[-0.005, 1], [-3, 0]] }); // prettier-ignore
  const at = Array.from({ length: 1000 }, (_, k) => 10 ** (-2 + (4 * k) / 999));

  it('misses a resonance of damping 0.005 by a tenth and more; the peak of a slope does not', () => {
    const { sensitivity, at: points } = numbersOf(plant, pid(0.1), { at });
    const naive = Math.max(...points.map(({ re, im }) => 1 / Math.hypot(1 + re, im)));
    expect(naive).toBeLessThan(0.98 * sensitivity.ms.value);
    // In a window of ±1e-7 around the peak no exact value exceeds it.
    const near = numbersOf(plant, pid(0.1), { at: [-1e-7, -1e-9, 0, 1e-9, 1e-7].map((d) => sensitivity.ms.frequency! * (1 + d)) });
    near.at.forEach(({ re, im }) => expect(1 / Math.hypot(1 + re, im)).toBeLessThanOrEqual(sensitivity.ms.value * (1 + 1e-12)));
  });
});

describe('a phase stitched together from atan2', () => {
  it('loses turns of the dead time between grid points; the analytic phase does not', () => {
    const frequencies = Array.from({ length: 60 }, (_, k) => 10 ** (-2 + (4 * k) / 59));
    const { at } = numbersOf(coefficients([1], [1, 1], 2), pid(1), { at: frequencies });
    let stitched = Math.atan2(at[0].im, at[0].re);
    for (const { re, im } of at.slice(1)) {
      const angle = Math.atan2(im, re);
      stitched = angle + 2 * Math.PI * Math.round((stitched - angle) / (2 * Math.PI));
    }
    const last = frequencies[frequencies.length - 1];
    const exact = ((-Math.atan(last) - 2 * last) * 180) / Math.PI;
    expect(Math.abs(at[at.length - 1].phaseDegrees - exact)).toBeLessThan(1e-9);
    expect(Math.abs((stitched * 180) / Math.PI - exact)).toBeGreaterThan(360);
  });
});

describe('expanded coefficients', () => {
  it('move the closed-loop poles of a stiff loop; factors do not', () => {
    const poles = Array.from({ length: 20 }, (_, k) => -(k + 1));
    const plant = roots(1, { poles: poles.map((p) => [p, 0]) });
    const { closedLoop } = frequencyNumbersOf(plant, pid(1e-6));
    // A gain this small moves no pole of 1/Π(s + k) by more than 1e-6/17!·… < 1e-18: they stay where they are.
    closedLoop.poles!.forEach(({ re, im }, k) => {
      expect(Math.abs(re - poles[k])).toBeLessThan(1e-12 * Math.abs(poles[k]));
      expect(im).toBe(0);
    });
    const naive = polynomialRoots(expandRoots(poles.map((re) => ({ re, im: 0 }))));
    expect(Math.max(...naive.map(({ re, im }) => Math.min(...poles.map((p) => Math.hypot(re - p, im)))))).toBeGreaterThan(1e-4);
  });
});

describe('computed roots of nearly multiple factors', () => {
  it('cost digits of L; Horner on the coefficients that were given does not', () => {
    // (s + 1)(s + 1.0001)…(s + 1.0005), the coefficients rounded once: the plant is what they say.
    const given = expandRoots([0, 1, 2, 3, 4, 5].map((k) => ({ re: -1 - k * 1e-4, im: 0 })));
    const rational = fromCoefficients([1], given);
    const product = new AxisProduct([rational]);
    product.evaluate(1);
    // At s = j the even and odd coefficients alternate in sign.
    const re = given[6] - given[4] + given[2] - given[0];
    const im = given[5] - given[3] + given[1];
    const exact = { re: re / (re * re + im * im), im: -im / (re * re + im * im) };
    expect(Math.hypot(product.re - exact.re, product.im - exact.im)).toBeLessThan(1e-14);
  });
});

describe('a rational approximation of dead time', () => {
  it('ends the phase crossovers; the exact one has hundreds', () => {
    const exact = frequencyNumbersOf(coefficients([1.65], [4.96, 1], 1.27), pid(1.409));
    // Second-order Padé of e^(−1.27 s).
    const theta = 1.27;
    const pade = coefficients(
      [theta ** 2 / 12, -theta / 2, 1].map((c) => 1.65 * c),
      [(theta ** 2 / 12) * 4.96, theta ** 2 / 12 + (theta / 2) * 4.96, theta / 2 + 4.96, 1],
    );
    const approximate = frequencyNumbersOf(pade, pid(1.409));
    expect(exact.margins.phaseCrossovers).toHaveLength(95);
    expect(approximate.margins.phaseCrossovers.length).toBeLessThanOrEqual(1);
    expect(Math.abs(approximate.margins.gain!.factor / exact.margins.gain!.factor - 1)).toBeGreaterThan(1e-3);
  });
});

it('what is built is what was entered', () => {
  expect(buildLoop(loopOf(coefficients([2.1], [0.35, 1, 0], 0.08))).plant.coefficients).toEqual({
    numerator: [2.1],
    denominator: [0.35, 1, 0],
  });
});
