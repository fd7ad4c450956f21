import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { buildLoop, loopAt, toParallelGains } from '@/analysis';
import { Loop, type LoopInput } from '@/contract';
import { loopOf, frequencyNumbersOf, pid, roots } from '../support/cast';

const SEED = 7;
const time = fc.double({ min: -2, max: 1, noNaN: true }).map((x) => 10 ** x);
const gain = fc.double({ min: -1, max: 1, noNaN: true }).map((x) => 10 ** x);
const deadTime = fc.oneof(fc.constant(0), time.map((x) => x / 3)); // prettier-ignore

/** Two lags, sometimes an integrator, sometimes a right-half-plane zero, sometimes dead time. */
const plant = fc
  .record({ first: time, second: time, integrates: fc.boolean(), inverse: fc.option(time), deadTime })
  .map(({ first, second, integrates, inverse, deadTime: theta }) =>
    roots(
      (inverse === null ? 1 : -inverse) / (first * second),
      { zeros: inverse === null ? [] : [[1 / inverse, 0]], poles: [[-1 / first, 0], [-1 / second, 0], ...(integrates ? [[0, 0] as [number, number]] : [])] }, // prettier-ignore
      theta,
    ),
  );
const controller = fc.record({ kp: gain, ki: gain, kd: gain, tf: time }).map(({ kp, ki, kd, tf }) => pid(kp, ki / 10, kd / 10, tf / 10));

type Plant = LoopInput['plant'];
const scaled = (model: Plant, k: number): Plant => (model.kind === 'roots' ? { ...model, gain: model.gain * k } : model);
const delayed = (model: Plant, extra: number): Plant =>
  model.kind === 'roots' ? { ...model, deadTime: (model.deadTime ?? 0) + extra } : model;
const check = <T>(property: fc.IPropertyWithHooks<T>, numRuns = 40) => fc.assert(property, { seed: SEED, numRuns });

describe('what holds for every loop', () => {
  it('gain k on the plant divides every gain margin by k', () =>
    check(
      fc.property(plant, controller, gain, (model, settings, k) => {
        const before = frequencyNumbersOf(model, settings).margins.phaseCrossovers;
        const after = frequencyNumbersOf(scaled(model, k), settings).margins.phaseCrossovers;
        const shared = Math.min(before.length, after.length);
        for (let i = 0; i < shared; i += 1) {
          expect(Math.abs((after[i].gainMarginFactor * k) / before[i].gainMarginFactor - 1)).toBeLessThan(1e-10);
          expect(Math.abs(after[i].frequency! / before[i].frequency! - 1)).toBeLessThan(1e-10);
        }
      }),
    ));

  it('S + T = 1', () =>
    check(
      fc.property(plant, controller, gain, (model, settings, omega) => {
        const { re, im, sensitivity, complementarySensitivity } = loopAt(buildLoop(loopOf(model, settings)))(omega);
        const size = (1 + re) ** 2 + im ** 2;
        const s = { re: (1 + re) / size, im: -im / size };
        expect(Math.hypot(s.re, s.im) / sensitivity).toBeCloseTo(1, 12);
        expect(Math.hypot(1 - s.re, s.im) / complementarySensitivity).toBeCloseTo(1, 8);
      }),
    ));

  it('0.999 of the delay margin keeps it stable, 1.001 does not, and at the margin itself 1 + L = 0', () =>
    check(
      fc.property(plant, controller, (model, unfiltered) => {
        const settings = { ...unfiltered, filters: [{ kind: 'lowPass' as const, timeConstant: 0.1 }] };
        const { margins, closedLoop } = frequencyNumbersOf(model, settings);
        if (!closedLoop.stable || !margins.delay || margins.delay.seconds < 1e-6) return;
        const { seconds, frequency } = margins.delay;
        expect(frequencyNumbersOf(delayed(model, 0.999 * seconds), settings).closedLoop.stable).toBe(true);
        expect(frequencyNumbersOf(delayed(model, 1.001 * seconds), settings).closedLoop.stable).toBe(false);
        const { re, im } = loopAt(buildLoop(loopOf(delayed(model, seconds), settings)))(frequency!);
        expect(Math.hypot(1 + re, im)).toBeLessThan(1e-8);
      }),
    ));

  it('a gain margin is where stability ends', () =>
    check(
      fc.property(plant, controller, (model, settings) => {
        const { margins, closedLoop } = frequencyNumbersOf(model, settings);
        if (!closedLoop.stable || !margins.gain) return;
        expect(frequencyNumbersOf(scaled(model, 0.999 * margins.gain.factor), settings).closedLoop.stable).toBe(true);
        expect(frequencyNumbersOf(scaled(model, 1.001 * margins.gain.factor), settings).closedLoop.stable).toBe(false);
      }),
    ));

  it('the guarantees that Ms gives hold', () =>
    check(
      fc.property(plant, controller, (model, settings) => {
        const { margins, sensitivity, closedLoop } = frequencyNumbersOf(model, settings);
        const ms = sensitivity.ms.value;
        if (!closedLoop.stable || ms <= 1) return;
        if (margins.gain) expect(margins.gain.factor).toBeGreaterThanOrEqual((ms / (ms - 1)) * (1 - 1e-9));
        if (margins.phase)
          expect(Math.abs(margins.phase.degrees)).toBeGreaterThanOrEqual((2 * Math.asin(1 / (2 * ms)) * 180) / Math.PI - 1e-6);
      }),
    ));

  it('a pole far in the left half-plane, cancelled by a zero, changes nothing', () =>
    check(
      fc.property(plant, controller, (model, settings) => {
        if (model.kind !== 'roots') return;
        const far = { re: -1e4, im: 0 };
        const before = frequencyNumbersOf(model, settings).margins;
        const after = frequencyNumbersOf(
          { ...model, zeros: [...(model.zeros ?? []), far], poles: [...(model.poles ?? []), far] },
          settings,
        ).margins;
        expect(after.gainCrossovers).toHaveLength(before.gainCrossovers.length);
        after.gainCrossovers.forEach(({ frequency }, i) =>
          expect(Math.abs(frequency / before.gainCrossovers[i].frequency - 1)).toBeLessThan(1e-9),
        );
      }),
      15,
    ));

  it('the live grid finds the same numbers', () =>
    check(
      fc.property(plant, controller, (model, settings) => {
        const full = frequencyNumbersOf(model, settings);
        const live = frequencyNumbersOf(model, settings, 'live');
        expect(live.closedLoop.stable).toBe(full.closedLoop.stable);
        expect(live.margins.gainCrossovers).toHaveLength(full.margins.gainCrossovers.length);
        expect(Math.abs(live.sensitivity.ms.value / full.sensitivity.ms.value - 1)).toBeLessThan(1e-9);
      }),
      15,
    ));

  it('converting a form changes nothing', () =>
    fc.assert(
      fc.property(plant, gain, fc.tuple(time, time, time), (model, kp, [ti, td, tf]) => {
        for (const form of ['series', 'ideal'] as const) {
          const given = { form, kp, ti, td, derivativeFilterTime: tf / 20 };
          const { kp: p, ki, kd, filterTime } = toParallelGains(Loop.parse({ plant: model, controller: given }).controller);
          const before = frequencyNumbersOf(model, given).margins;
          const after = frequencyNumbersOf(model, pid(p, ki, kd, filterTime)).margins;
          expect(after.gainCrossovers).toHaveLength(before.gainCrossovers.length);
          after.gainCrossovers.forEach((crossover, i) => {
            expect(Math.abs(crossover.frequency / before.gainCrossovers[i].frequency - 1)).toBeLessThan(1e-9);
            expect(Math.abs(crossover.phaseMarginDegrees - before.gainCrossovers[i].phaseMarginDegrees)).toBeLessThan(1e-6);
          });
          expect(Math.abs(after.disk.alpha - before.disk.alpha)).toBeLessThan(1e-9);
        }
      }),
      { seed: SEED, numRuns: 25 },
    ));
});
