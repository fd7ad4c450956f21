import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { buildLoop, loopAt } from '@/analysis';
import { switchedTo, writtenIn } from '@/components/bench/draft/form';
import { contentWith, type Form, type Gains, type Settings, startSettings } from '@/components/bench/draft/settings';
import { benchLoop } from '@/components/bench/live/bench-loop';
import type { BenchSubject } from '@/components/bench/subject/bench-subject';
import { PlantContent } from '@/contract';

const plant = PlantContent.parse({ plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 } });
const subject = {
  plant: { ...plant, id: 'plant', name: 'Speed', revision: 1 },
  shownCase: { id: 'nominal', name: 'nominal', parameters: {} },
  opened: null,
} as unknown as BenchSubject;

const FREQUENCIES = [0.01, 0.3, 2, 11, 150];
const loopOf = (gains: Gains) => {
  const at = loopAt(buildLoop(benchLoop(subject, { ...startSettings, ...gains }, { reference: 1, load: 1 })));
  return FREQUENCIES.map((frequency) => at(frequency));
};

/** Relative to |L|: the conversions are a few operations, and the loop takes the gains as they are. */
const ROUNDING = 1e-9;

function expectSameLoop(before: Gains, after: Gains) {
  const [a, b] = [loopOf(before), loopOf(after)];
  a.forEach((point, n) => {
    const size = Math.hypot(point.re, point.im);
    expect(Math.hypot(point.re - b[n].re, point.im - b[n].im)).toBeLessThanOrEqual(ROUNDING * size);
  });
}

const size = fc.double({ min: 0.01, max: 100, noNaN: true });
const someGains: fc.Arbitrary<Gains> = fc.record({
  form: fc.constantFrom<Form>('parallel', 'ideal', 'series'),
  kp: size,
  integral: size,
  derivative: fc.oneof(fc.constant(0), size),
  filterTime: fc.oneof(fc.constant(0), fc.double({ min: 1e-4, max: 1, noNaN: true })),
});

const pid: Gains = { form: 'parallel', kp: 1.05, integral: 0.42, derivative: 0.3, filterTime: 0.035 };
const gainsIn = (form: Form, gains: Gains): Gains => {
  const written = writtenIn(form, gains);
  if ('refusal' in written) throw new Error(written.refusal);
  return written.gains;
};

describe('a switch of form', () => {
  it('leaves the loop as it is, there and back', () => {
    fc.assert(
      fc.property(someGains, fc.constantFrom<Form>('parallel', 'ideal', 'series'), (gains, form) => {
        const there = writtenIn(form, gains);
        if ('refusal' in there) return;
        expectSameLoop(gains, there.gains);
        const back = writtenIn(gains.form, there.gains);
        if ('refusal' in back) return;
        expectSameLoop(gains, back.gains);
      }),
      { seed: 3, numRuns: 300 },
    );
  });

  it('gives the times of the ideal form', () => {
    expect(gainsIn('ideal', pid)).toEqual({ form: 'ideal', kp: 1.05, integral: 2.5, derivative: 0.3 / 1.05, filterTime: 0.035 });
  });

  it('back to the kept form gives the kept gains to the last digit', () => {
    expect(switchedTo('parallel', gainsIn('ideal', pid), pid)).toEqual({ gains: pid });
    expect(switchedTo('parallel', { ...gainsIn('ideal', pid), kp: 1.06 }, pid)).not.toEqual({ gains: pid });
  });

  it('is refused with the reason where the form cannot say the controller', () => {
    const complexZeros = writtenIn('series', { ...pid, kp: 0.5, integral: 2 });
    expect(complexZeros).toEqual({ refusal: 'The zeros of the controller are a complex pair: the series form has real ones only.' });
    const mixed = writtenIn('ideal', { ...pid, integral: -1 });
    expect(mixed).toEqual({ refusal: 'Ti or Td would be negative: the gains differ in sign.' });
    expect(writtenIn('ideal', { ...pid, kp: 0 })).toHaveProperty('refusal');
  });

  it('without integral action has no Ti, and Ki of 0 again', () => {
    const ideal = gainsIn('ideal', { ...pid, integral: 0 });
    expect(ideal.integral).toBeNull();
    expect(gainsIn('parallel', ideal).integral).toBe(0);
  });

  it('keeps weights, feedforward and filters', () => {
    const settings: Settings = { ...startSettings, ...pid, feedforward: 0.3, filters: [{ kind: 'lowPass', timeConstant: 0.02 }] };
    const { controller } = contentWith(null, { ...settings, ...gainsIn('series', pid) });
    expect(controller).toMatchObject({ form: 'series', feedforward: { gain: 0.3 }, filters: [{ kind: 'lowPass', timeConstant: 0.02 }] });
  });
});
