import { describe, expect, it } from 'vitest';
import { coefficients, frequencyNumbersOf, numbersOf, pid, roots } from '../support/cast';

const codes = (analysis: ReturnType<typeof numbersOf>) => analysis.warnings.map(({ code }) => code);

describe('crossings at the ends of the axis', () => {
  it('counts ω = 0 where L(0) is finite and negative', () => {
    const { margins, closedLoop } = numbersOf(coefficients([2.69], [0.912, -1]), pid(0.9773));
    expect(margins.phaseCrossovers).toEqual([{ frequency: 0, gainMarginFactor: expect.closeTo(1 / (2.69 * 0.9773), 12) }]);
    expect(closedLoop).toMatchObject({ stable: true, encirclements: -1, encirclementsNeeded: -1 });
  });

  it('counts ω → ∞ where L(∞) is finite and negative, and Ms as the limit that no frequency reaches', () => {
    const { margins, sensitivity } = numbersOf(coefficients([-1, 1], [1, 1]), pid(0.5, 0.5));
    expect(margins.gain).toMatchObject({ factor: 2, frequency: null });
    expect(sensitivity.ms).toMatchObject({ value: 2, frequency: null });
  });

  it('gives an integrator under P control no phase crossover, Ms 1 at infinity and Mt 1 at zero', () => {
    const { margins, sensitivity } = numbersOf(coefficients([1.55], [1, 0]), pid(0.829));
    expect(margins).toMatchObject({ gain: null, gainReduction: null, phaseCrossovers: [], modulus: 1 });
    expect(margins.disk).toMatchObject({ alpha: 2, gainHigh: null, phaseDegrees: 90 });
    expect(sensitivity).toMatchObject({ ms: { value: 1, frequency: null }, mt: { value: 1, frequency: 0 } });
  });
});

describe('open-loop unstable and conditionally stable loops', () => {
  it('knows the gain intervals of a loop with three phase crossovers', () => {
    // K(s²+2s+4)/(s(s+4)(s+6)(s²+1.4s+1)): stable for 0 < K < 15.61 and 67.51 < K < 163.56 (Ogata, ch. 8, from memory).
    const plant = coefficients([1, 2, 4], [1, 11.4, 39, 43.6, 24, 0]);
    const limits = numbersOf(plant).margins.phaseCrossovers.map((crossover) => crossover.gainMarginFactor);
    expect(limits[0]).toBeCloseTo(15.61062136, 7);
    expect(limits[1]).toBeCloseTo(67.5126005, 6);
    expect(limits[2]).toBeCloseTo(163.5567781, 6);
    expect([10, 30, 100, 200].map((k) => numbersOf(plant, pid(k)).closedLoop.stable)).toEqual([true, false, true, false]);
    expect(numbersOf(plant, pid(100)).margins.gainReduction!.factor).toBeCloseTo(0.675126005, 8);
  });

  it('counts the same unstable poles by roots and, with a dead time too short to matter, by encirclements', () => {
    const plants: [number[], number[]][] = [
      [[1], [1, 1, 1, 0]],
      [[5], [1, -2, 5]],
      [
        [3, 36, 108],
        [1, 2, 1, 0],
      ],
      [
        [-2, 1],
        [1, -1, 0, 0],
      ],
      [[1], [1, 0, 4]],
      [[-3], [1, 1, -2]],
      [
        [1, 1],
        [1, 0, 0, 0],
      ],
    ];
    for (const [numerator, denominator] of plants)
      for (const gain of [0.01, 0.1, 1, 10, 100, -1]) {
        const exact = frequencyNumbersOf(coefficients(numerator, denominator), pid(gain)).closedLoop;
        if (exact.poles!.some(({ re, im }) => Math.abs(re) < 1e-6 * (1 + Math.abs(im)))) continue;
        const counted = frequencyNumbersOf(coefficients(numerator, denominator, 1e-9), pid(gain)).closedLoop;
        expect([numerator, denominator, gain, counted.unstablePoles]).toEqual([numerator, denominator, gain, exact.unstablePoles]);
        expect(counted.encirclements).toBe(exact.encirclements);
      }
  });
});

describe('poles on the boundary and modes that hide', () => {
  it('calls a loop at its limit of stability unstable, with the pair counted', () => {
    const analysis = numbersOf(coefficients([1], [1, 3, 3, 1]), pid(8));
    expect(analysis.closedLoop).toMatchObject({ stable: false, unstablePoles: 2 });
    expect(codes(analysis)).toContain('onBoundary');
  });

  it('does the same with dead time', () => {
    const analysis = numbersOf(coefficients([1], [1, 0], 1), pid(Math.PI / 2));
    expect(analysis.closedLoop).toMatchObject({ stable: false, unstablePoles: 2 });
    expect(codes(analysis)).toContain('onBoundary');
  });

  it.each([0, 0.1])('sees an unstable mode that a zero cancels, dead time %d', (deadTime) => {
    const analysis = numbersOf(roots(1, { zeros: [[1, 0]], poles: [[1, 0], [-2, 0]] }, deadTime)); // prettier-ignore
    expect(analysis.closedLoop).toMatchObject({ stable: false, unstablePoles: 1 });
    expect(codes(analysis)).toContain('hiddenMode');
  });

  it.each([0, 0.2])('sees an integrator that the plant’s own zero cancels, dead time %d', (deadTime) => {
    const analysis = numbersOf(coefficients([1, 0], [1, 2, 1], deadTime), pid(1, 1));
    expect(analysis.closedLoop).toMatchObject({ stable: false, unstablePoles: 1 });
    expect(codes(analysis)).toContain('hiddenMode');
  });
});

describe('neutral loops', () => {
  it('ends the list of crossovers and says so', () => {
    const analysis = numbersOf(coefficients([0.5, 1], [1, 1], 0.1));
    expect(analysis.margins.phaseCrossovers).toHaveLength(200);
    expect(analysis.closedLoop.stable).toBe(true);
    expect(codes(analysis)).toContain('neutralLoop');
  });

  it.each([1, 2])('is unstable with |L(∞)| = %d, and no delay is bearable', (gain) => {
    const analysis = numbersOf(coefficients([gain, 2.5], [1, 1], 0.1));
    expect(analysis.closedLoop.stable).toBe(false);
    expect(analysis.margins.delay).toMatchObject({ seconds: 0 });
  });

  it('has Ms 1/(1 − |L(∞)|) where the plant is a gain and a dead time', () => {
    expect(numbersOf(coefficients([3], [1], 0.5), pid(0.2)).sensitivity.ms.value).toBeCloseTo(2.5, 12);
  });
});

describe('degenerate controllers', () => {
  it('with no gain at all has margins without limit and the plant’s own stability', () => {
    const { margins, sensitivity, closedLoop } = numbersOf(coefficients([1], [1, 1]), pid(0));
    expect(margins).toMatchObject({ gain: null, phase: null, delay: null, gainCrossovers: [], phaseCrossovers: [], modulus: 1 });
    expect(sensitivity).toMatchObject({ ms: { value: 1 }, mt: { value: 0 }, noiseGain: { value: 0 } });
    expect(closedLoop.stable).toBe(true);
  });

  it('with plant and controller both negative starts at 0° as a positive loop does', () => {
    const { at } = numbersOf(coefficients([-1], [1, 1]), pid(-2), { at: [1e-6] });
    expect(at[0].phaseDegrees).toBeCloseTo(0, 3);
  });

  it('without a derivative filter has no bound on the command that noise makes', () => {
    const analysis = numbersOf(coefficients([1], [1, 1, 0]), pid(1, 0, 0.1));
    expect(analysis.sensitivity.noiseGain.value).toBeNull();
    expect(analysis.timeResponse).toBeNull();
    expect(codes(analysis)).toContain('improperController');
  });

  it('keeps a feedforward out of every margin, and in the reference bandwidth', () => {
    const plain = numbersOf(coefficients([3.75], [2.04, 1]), pid(1.19));
    const fed = numbersOf(coefficients([3.75], [2.04, 1]), { ...pid(1.19), feedforward: { gain: 0.107 } });
    expect(fed.margins).toEqual(plain.margins);
    expect(plain.bandwidth.reference).toBeCloseTo(plain.bandwidth.closedLoop!, 10);
  });
});

describe('three gain crossovers at a driveline resonance, stable', () => {
  // A shuffle mode of 4 Hz and damping 0.03 behind a mass of 1,680 kg; computed independently at 30 digits.
  const omega = 2 * Math.PI * 4;
  const damping = 0.03;
  const plant = roots(
    (omega * omega) / (1680 * 0.05),
    { poles: [[-19.5 / 1680, 0], [-20, 0], [-damping * omega, omega * Math.sqrt(1 - damping * damping)]] }, // prettier-ignore
    0.05,
  );
  const { margins, sensitivity, closedLoop } = numbersOf(plant, pid(6000, 600));

  it('finds all three and takes the delay margin from the third', () => {
    const want = [3.589697308, 24.18022755, 25.848857];
    expect(margins.gainCrossovers).toHaveLength(3);
    margins.gainCrossovers.forEach(({ frequency }, i) => expect(frequency).toBeCloseTo(want[i], 7));
    expect(margins.delay!.seconds).toBeCloseTo(0.1285301773, 9);
    expect(margins.gain!.factor).toBeCloseTo(3.418901879, 8);
    expect(sensitivity.ms.value).toBeCloseTo(1.492624559, 8);
    expect(closedLoop.stable).toBe(true);
  });
});
