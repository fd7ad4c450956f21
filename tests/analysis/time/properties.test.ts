import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LoopInput } from '@/contract';
import type { Curve } from '@/analysis/time/curve';
import { answer, curvesOf } from './loop-cast';

/** Lags of 0.1 to 10 s with a dead time below the lag, under a PI that cancels the lag at a moderate gain: always stable. */
const calmLoop = fc
  .record({
    gain: fc.double({ min: 0.1, max: 10, noNaN: true }),
    lag: fc.double({ min: 0.1, max: 10, noNaN: true }),
    share: fc.double({ min: 0.01, max: 1, noNaN: true }),
    speed: fc.double({ min: 0.1, max: 0.7, noNaN: true }),
  })
  .map(({ gain, lag, share, speed }) => {
    const deadTime = share * lag;
    const kp = (speed * lag) / (gain * deadTime);
    return { gain, lag, deadTime, controller: { form: 'parallel' as const, kp, ki: kp / lag } };
  });
type CalmLoop = typeof calmLoop extends fc.Arbitrary<infer T> ? T : never;

const loopWith = ({ gain, lag, deadTime, controller }: CalmLoop, sensorShare = 0): LoopInput => ({
  plant: { kind: 'coefficients', numerator: [gain], denominator: [lag, 1], deadTime: deadTime * (1 - sensorShare) },
  sensor: { timeConstant: 0, deadTime: deadTime * sensorShare },
  controller,
});

const check = (property: (loop: CalmLoop) => void) => fc.assert(fc.property(calmLoop, property), { seed: 7, numRuns: 25 });
const spread = (end: number) => Array.from({ length: 40 }, (_, k) => (end * (k + 0.5)) / 40);
const greatestGap = (times: readonly number[], a: Curve, b: (t: number) => number) =>
  Math.max(...times.map((t) => Math.abs(a.valueAt(t) - b(t))));

describe('stable loops with integral action', () => {
  it('end at the reference and bring a load back to 0', () => {
    check((loop) => {
      const { metrics, load } = answer(loopWith(loop));
      expect(metrics).toMatchObject({ finalValue: 1, steadyStateError: 0 });
      expect(metrics!.loadSettlingTime).toBeGreaterThan(0);
      expect(Math.abs(load!.output[load!.output.length - 1])).toBeLessThanOrEqual(0.02 * metrics!.loadPeak!);
    });
  });

  it('are shown for 1.25 to 2 settling times', () => {
    check((loop) => {
      const { metrics, reference, load } = answer(loopWith(loop));
      for (const [series, settling] of [
        [reference, metrics!.settlingTime],
        [load, metrics!.loadSettlingTime],
      ] as const) {
        // prettier-ignore
        const share = series!.time[series!.time.length - 1] / settling!;
        expect(share).toBeGreaterThan(1.25);
        expect(share).toBeLessThan(2);
      }
    });
  });

  it('answer in proportion to the step, also a negative one', () => {
    check((loop) => {
      const unit = answer(loopWith(loop));
      const other = answer(loopWith(loop), { referenceStep: -3, loadStep: 0.5 });
      unit.reference!.output.forEach((y, k) => expect(other.reference!.output[k]).toBeCloseTo(-3 * y, 10));
      unit.load!.control.forEach((u, k) => expect(other.load!.control[k]).toBeCloseTo(0.5 * u, 10));
      expect(other.metrics!.overshootPercent).toBe(unit.metrics!.overshootPercent);
      expect(other.metrics!.iae).toBeCloseTo(3 * unit.metrics!.iae!, 9);
    });
  });

  it('draw straight lines that keep within 1e-3 of the curve', () => {
    check((loop) => {
      const { reference } = answer(loopWith(loop));
      const { output } = curvesOf(loopWith(loop)).reference;
      for (let k = 1; k < reference!.time.length; k += 1) {
        const middle = (reference!.time[k - 1] + reference!.time[k]) / 2;
        expect(Math.abs((reference!.output[k - 1] + reference!.output[k]) / 2 - output.valueAt(middle))).toBeLessThan(1e-3 * output.size);
      }
    });
  });
});

describe('a dead time moved from the plant to the sensor', () => {
  it('leaves the command as it was and brings the output forward by what was moved', () => {
    check((loop) => {
      const before = curvesOf(loopWith(loop)).reference;
      const after = curvesOf(loopWith(loop, 0.3)).reference;
      const moved = 0.3 * loop.deadTime;
      const times = spread(Math.min(before.horizon, after.horizon) - moved);
      expect(greatestGap(times, after.control, (t) => before.control.valueAt(t))).toBeLessThan(2e-8 * before.control.size);
      expect(greatestGap(times, after.output, (t) => before.output.valueAt(t + moved))).toBeLessThan(2e-8);
    });
  });
});
