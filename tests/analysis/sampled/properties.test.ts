import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyseLoop, buildLoop } from '@/analysis';
import { clockwiseEncirclements } from '@/analysis/margins/encirclements';
import { loopNumbers } from '@/analysis/margins/loop-numbers';
import { SampledLoop } from '@/analysis/sampled/sampled-loop';
import { sampledModel } from '@/analysis/sampled/sampled-model';
import { Loop, type LoopInput } from '@/contract';
import { coefficients, loopOf, numbersOf, pid, roots } from '../support/cast';
import { every } from './cast';

const SEED = 11;
const check = <T>(property: fc.IPropertyWithHooks<T>, numRuns = 25) => fc.assert(property, { seed: SEED, numRuns });
const decades = (low: number, high: number) => fc.double({ min: low, max: high, noNaN: true }).map((x) => 10 ** x);

/** Two lags or a weakly damped pair, sometimes an integrator, at a period from a fiftieth of the slowest to about the fastest. */
const sampledLoop: fc.Arbitrary<Loop> = fc
  .record({
    first: decades(-1, 0.5),
    second: decades(-1, 0.5),
    swing: fc.option(decades(0, 1)),
    integrates: fc.boolean(),
    deadTime: fc.oneof(fc.constant(0), decades(-2, 0)),
    gain: decades(-1, 0.5),
    integral: fc.constantFrom('backward', 'forward', 'trapezoidal'),
    derivative: fc.constantFrom('backward', 'trapezoidal'),
    period: decades(-2, -0.5),
    computationDelay: fc.oneof(fc.constant(0), decades(-2.5, -0.5)),
  })
  .map(({ first, second, swing, integrates, deadTime, gain, integral, derivative, period, computationDelay }) => {
    const pair: [number, number][] = swing === null ? [[-1 / first, 0], [-1 / second, 0]] : [[-0.1 * swing, swing]]; // prettier-ignore
    const poles: [number, number][] = integrates ? [...pair, [0, 0]] : pair;
    const size = swing === null ? 1 / (first * second) : swing * swing;
    return Loop.parse({
      plant: roots(size, { poles }, deadTime),
      controller: pid(gain, gain / 5, gain / 10, 0.05),
      sampling: { period, integral, derivative, computationDelay },
    });
  });

const bare = { curves: false, responses: false };
const withExtra = (loop: Loop, extra: number): Loop => ({
  ...loop,
  plant: { ...loop.plant, deadTime: (loop.plant as { deadTime: number }).deadTime + extra } as Loop['plant'],
});
const polesOf = (loop: Loop) => analyseLoop(loop, bare).closedLoop.poles!;
const outermost = (loop: Loop) => Math.max(...polesOf(loop).map(({ re, im }) => Math.hypot(re, im)));

/** Loops whose poles at their delay margin are few enough to be found one by one. */
const MOST_PERIODS = 30;
const withMargin = sampledLoop
  .map((loop) => ({ loop, ...analyseLoop(loop, bare) }))
  .filter(({ loop, margins }) => margins.delay !== null && margins.delay.seconds < MOST_PERIODS * loop.sampling!.period);

describe('the exact delay margin', () => {
  it('puts a pole on the unit circle, at the frequency it names', () =>
    check(
      fc.property(withMargin, ({ loop, margins }) => {
        const { seconds, frequency } = margins.delay!;
        const angle = frequency! * loop.sampling!.period;
        const distances = polesOf(withExtra(loop, seconds)).map(({ re, im }) => Math.hypot(re - Math.cos(angle), im - Math.sin(angle)));
        expect(Math.min(...distances)).toBeLessThan(1e-7);
      }),
    ));

  it('is the first: with any less a stable loop stays stable, with more it is not', () =>
    check(
      fc.property(
        withMargin.filter(({ closedLoop }) => closedLoop.stable),
        ({ loop, margins }) => {
          const { seconds } = margins.delay!;
          for (let k = 1; k <= 12; k += 1) expect(outermost(withExtra(loop, ((k - 0.01) / 12) * seconds))).toBeLessThan(1 + 1e-9);
          expect(outermost(withExtra(loop, seconds + 1e-4 * loop.sampling!.period))).toBeGreaterThan(1);
        },
      ),
    ));
});

describe('the delay margin of a plant that answers at once', () => {
  const gain = (deadTime: number, kp = 0.2) => numbersOf(coefficients([0.5], [1], deadTime), pid(kp, 0.5), every(0.1));
  const stableAt = (deadTime: number, kp?: number) => gain(deadTime, kp).closedLoop.stable;

  it('ends where a whole period more tips it over', () => {
    const { seconds, frequency } = gain(0.05).margins.delay!;
    expect(frequency).toBeNull();
    expect(Math.abs((seconds + 0.05) / 0.1 - Math.round((seconds + 0.05) / 0.1))).toBeLessThan(1e-9);
    expect(stableAt(0.05 + seconds - 1e-6)).toBe(true);
    expect(stableAt(0.05 + seconds + 1e-6)).toBe(false);
  });

  it('is 0 where any delay at all does', () => {
    expect(stableAt(0, 2.2)).toBe(true);
    expect(stableAt(1e-6, 2.2)).toBe(false);
    expect(gain(0, 2.2).margins.delay).toEqual({ seconds: 0, frequency: null });
  });
});

describe('a sampled loop', () => {
  it('counts the same unstable poles by roots and by the turns of the Nyquist curve', () =>
    check(
      fc.property(sampledLoop, (input) => {
        const model = buildLoop(input);
        const loop = new SampledLoop(sampledModel(model, model.sampled!));
        const numbers = loopNumbers(loop, 'full');
        const { closedLoop } = analyseLoop(input, bare);
        if (numbers.margins.modulus < 1e-6 || !closedLoop.poles) return;
        expect(clockwiseEncirclements(loop, numbers) || 0).toBe(closedLoop.unstablePoles + closedLoop.encirclementsNeeded);
      }),
    ));

  it('does not see where in the path a delay stands', () =>
    check(
      fc.property(sampledLoop, decades(-2, -0.5), (loop, extra) => {
        const inPlant = analyseLoop(withExtra(loop, extra), bare).margins;
        const { sampling } = loop;
        const inComputer = analyseLoop(
          { ...loop, sampling: { ...sampling!, computationDelay: sampling!.computationDelay + extra } },
          bare,
        ).margins;
        const inSensor = analyseLoop({ ...loop, sensor: { timeConstant: 0, deadTime: extra } }, bare).margins;
        for (const margins of [inComputer, inSensor]) {
          expect(margins.modulus).toBeCloseTo(inPlant.modulus, 9);
          expect(margins.gainCrossovers.length).toBe(inPlant.gainCrossovers.length);
        }
      }),
    ));
});

describe('as the sample period goes to 0', () => {
  const plant = coefficients([2.1], [0.35, 1, 0], 0.08);
  const controller: LoopInput['controller'] = {
    ...pid(1.2, 0.4, 0.1, 0.02),
    filters: [
      { kind: 'lowPass', timeConstant: 0.01 },
      { kind: 'notch', frequency: 12, depth: 0.3, width: 0.5 },
    ],
  };
  const rest = { sensor: { timeConstant: 0.03, deadTime: 0.02 } };
  const continuous = numbersOf(plant, controller, rest);
  const sampled = (period: number) =>
    analyseLoop(loopOf(plant, controller, { ...rest, ...every(period, { integral: 'trapezoidal', derivative: 'trapezoidal' }) }), bare);

  it.each([
    ['phase margin', (a: typeof continuous) => a.margins.phase!.degrees],
    ['gain margin', (a: typeof continuous) => a.margins.gain!.factor],
    ['delay margin', (a: typeof continuous) => a.margins.delay!.seconds],
    ['Ms', (a: typeof continuous) => a.sensitivity.ms.value],
    ['Mt', (a: typeof continuous) => a.sensitivity.mt.value],
    ['bandwidth', (a: typeof continuous) => a.bandwidth.closedLoop!],
  ])('the %s becomes that of the continuous loop, in proportion to the period', (_, read) => {
    const errorAt = (period: number) => Math.abs(read(sampled(period)) / read(continuous) - 1);
    const [coarse, fine] = [errorAt(2e-3), errorAt(2e-4)];
    expect(fine).toBeLessThan(2e-3);
    // Half a period of hold remains, and nothing of another order: a tenth of the period, a tenth of the difference.
    expect(fine / coarse).toBeGreaterThan(0.08);
    expect(fine / coarse).toBeLessThan(0.12);
  });

  it('the step response becomes that of the continuous loop', () => {
    const settled = (period: number) =>
      analyseLoop(loopOf(plant, controller, { ...rest, ...every(period) }), { curves: false }).timeResponse!.metrics!;
    const want = continuous.timeResponse!.metrics!;
    const got = settled(2e-3);
    for (const key of ['riseTime', 'settlingTime', 'overshootPercent', 'loadPeak', 'iae'] as const)
      expect(Math.abs(got[key]! / want[key]! - 1)).toBeLessThan(0.03);
  });
});
