import { describe, expect, it } from 'vitest';
import { analyseLoop } from '@/analysis';
import { resolveFormula } from '@/analysis/formula';
import { Loop } from '@/contract';
import { referenceLoops, type Expected } from './support/reference-loops';

/** numerics.md's tolerances. A flat peak fixes its height far better than its place, and a threshold on a flat slope too. */
const RELATIVE = 1e-6;
const DEGREES = 1e-5;
const PEAK_PLACE = 1e-4;
const BANDWIDTH = 1e-5;
const SAMPLE = 1e-8;

const close = (got: number | null | undefined, want: number | null, relative: number, absolute = 0) => {
  if (want === null) return expect(got).toBeNull();
  expect(Math.abs(got! - want)).toBeLessThanOrEqual(Math.max(relative * Math.abs(want), absolute));
};

describe.each(referenceLoops)('$id: $title', ({ loop, expect: want }) => {
  const at = want.samples.map(({ frequency }) => frequency);
  const analysis = analyseLoop(resolveFormula(Loop.parse({ ...loop, at })));

  it('is judged stable or unstable with the right number of poles', () => {
    expect(analysis.closedLoop.stable).toBe(want.stable);
    expect(analysis.closedLoop.unstablePoles).toBe(want.unstablePoles);
    expect(analysis.closedLoop.encirclements - analysis.closedLoop.encirclementsNeeded).toBe(want.unstablePoles);
  });

  it('has every crossover and no other', () => {
    const { gainCrossovers, phaseCrossovers } = analysis.margins;
    expect(gainCrossovers).toHaveLength(want.gainCrossovers.length);
    expect(phaseCrossovers).toHaveLength(want.phaseCrossovers.length);
    want.gainCrossovers.forEach((item, i) => {
      close(gainCrossovers[i].frequency, item.frequency, RELATIVE);
      close(gainCrossovers[i].phaseMarginDegrees, item.phaseMarginDegrees, 0, DEGREES);
    });
    want.phaseCrossovers.forEach((item, i) => {
      close(phaseCrossovers[i].frequency, item.frequency, RELATIVE, 1e-9);
      close(phaseCrossovers[i].gainMarginFactor, item.gainMarginFactor, RELATIVE);
    });
  });

  it('has the margins', () => expectMargins(analysis, want));

  it('has the peaks and bandwidths', () => {
    const { ms, mt } = analysis.sensitivity;
    close(ms.value, want.ms.value, RELATIVE);
    close(ms.frequency, want.ms.frequency, PEAK_PLACE, 1e-9);
    close(mt.value, want.mt.value, RELATIVE);
    close(mt.frequency, want.mt.frequency, PEAK_PLACE, 1e-9);
    close(analysis.bandwidth.closedLoop, want.bandwidth.closedLoop, BANDWIDTH);
    close(analysis.bandwidth.sensitivity, want.bandwidth.sensitivity, BANDWIDTH);
  });

  it('has the exact value and unwrapped phase of L where asked', () => {
    want.samples.forEach(({ re, im, phaseDegrees }, i) => {
      const got = analysis.at[i];
      expect(Math.hypot(got.re - re, got.im - im)).toBeLessThanOrEqual(SAMPLE * Math.hypot(re, im));
      close(got.phaseDegrees, phaseDegrees, 1e-9, DEGREES);
    });
  });

  it('is drawn with at most 0.5 dB and 5° between neighbours', () => {
    const { magnitude, phaseDegrees } = analysis.frequencyResponse!.loop;
    expect(magnitude.length).toBeGreaterThan(50);
    expect(magnitude.length).toBeLessThanOrEqual(4000);
    for (let k = 1; k < magnitude.length; k += 1) {
      expect(Math.abs(20 * Math.log10(magnitude[k] / magnitude[k - 1]))).toBeLessThanOrEqual(0.5);
      expect(Math.abs(phaseDegrees[k] - phaseDegrees[k - 1])).toBeLessThanOrEqual(5);
    }
  });
});

const expectMargins = ({ margins }: ReturnType<typeof analyseLoop>, want: Expected) => {
  close(margins.gain?.factor ?? null, want.gain?.factor ?? null, RELATIVE);
  close(margins.gain?.frequency ?? null, want.gain?.frequency ?? null, RELATIVE, 1e-9);
  close(margins.gainReduction?.factor ?? null, want.gainReduction?.factor ?? null, RELATIVE);
  close(margins.gainReduction?.frequency ?? null, want.gainReduction?.frequency ?? null, RELATIVE, 1e-9);
  close(margins.phase?.degrees ?? null, want.phase?.degrees ?? null, 0, DEGREES);
  close(margins.phase?.frequency ?? null, want.phase?.frequency ?? null, RELATIVE);
  close(margins.delay?.seconds ?? null, want.delay?.seconds ?? null, RELATIVE);
  close(margins.delay?.frequency ?? null, want.delay?.frequency ?? null, RELATIVE);
  close(margins.disk.alpha, want.disk.alpha, RELATIVE);
  close(margins.modulus, 1 / want.ms.value, RELATIVE);
};
