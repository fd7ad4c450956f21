import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { LoopInput, TimeMetrics } from '@/contract';
import { timeResponse } from '@/analysis/time';
import { respond } from '@/analysis/time/time-response';
import { modelOf, stabilityOf } from './loop-cast';

interface ReferenceCase {
  id: string;
  loop: LoopInput;
  time?: { times: number[]; reference: number[]; load: number[]; metrics: Partial<TimeMetrics> };
}

const { cases } = JSON.parse(readFileSync('tests/fixtures/loops.json', 'utf8')) as { cases: ReferenceCase[] };
const timed = cases.filter((item) => item.time && !item.loop.sampling);

/** The fixture gives 12 digits, but was itself integrated; 1e-7 of the peak is what it is good for. */
const OF_PEAK = 1e-7;

/** degenerate-01 counts no overshoot although its own samples pass the final value by 1.5 %; the closed form is tested in second-order.test.ts. */
const MISCOUNTED_OVERSHOOT = ['degenerate-01'];

describe.each(timed)('$id', ({ id, loop, time }) => {
  const model = modelOf(loop);
  const stability = stabilityOf(model);
  const { times, reference, load, metrics } = time!;

  it('follows the reference responses at every time given', () => {
    const steps = respond(model, null, stability);
    if ('code' in steps) throw new Error(steps.message);
    for (const [want, got] of [
      [reference, steps.reference.output],
      [load, steps.load.output],
    ] as const) {
      const peak = Math.max(...want.map(Math.abs));
      times.forEach((t, i) => expect(Math.abs(got.valueAt(t) - want[i])).toBeLessThan(OF_PEAK * peak));
    }
  });

  it('finds the metrics', () => {
    const got = timeResponse(model, { duration: null, referenceStep: 1, loadStep: 1 }, stability).timeResponse!.metrics!;
    expect(Math.abs(got.riseTime! / metrics.riseTime! - 1)).toBeLessThan(1e-6);
    expect(Math.abs(got.settlingTime! / metrics.settlingTime! - 1)).toBeLessThan(1e-6);
    expect(Math.abs(got.steadyStateError! - metrics.steadyStateError!)).toBeLessThan(1e-9);
    if (!MISCOUNTED_OVERSHOOT.includes(id)) expect(Math.abs(got.overshootPercent! - metrics.overshootPercent!)).toBeLessThan(1e-4);
  });
});
