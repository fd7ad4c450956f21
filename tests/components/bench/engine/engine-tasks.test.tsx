import { describe, expect, it } from 'vitest';
import { doTask } from '@/components/bench/engine/engine-tasks';
import { timeEnds } from '@/components/bench/live/time-ends';
import { Loop } from '@/contract';
import { endOfResponse } from '@/figures';

const loop = (kp: number) =>
  Loop.parse({
    plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
    controller: { form: 'parallel', kp, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 },
  });
const full = (kp: number) => doTask('analyse', { loop: loop(kp), detail: 'full', end: null });

describe('the analysis of a loop', () => {
  it('as an outline has the numbers of the whole, and no responses', () => {
    const outline = doTask('analyse', { loop: loop(1.2), detail: 'outline', end: null });
    expect(outline.timeResponse).toBeNull();
    expect(outline.frequencyResponse!.sensitivity).toHaveLength(outline.frequencyResponse!.frequencies.length);
    expect(outline.sensitivity.ms.value).toBeCloseTo(full(1.2).sensitivity.ms.value, 8);
    expect(outline.margins.phase!.degrees).toBeCloseTo(full(1.2).margins.phase!.degrees, 6);
  });

  it('while a gain moves has coarse responses until the end that is asked for', () => {
    const live = doTask('analyse', { loop: loop(1.2), detail: 'live', end: 9 });
    expect(endOfResponse(live, 'load')).toBe(9);
    expect(live.timeResponse!.reference!.time.length).toBeLessThan(full(1.2).timeResponse!.reference!.time.length);
  });

  it('can be sent from a worker: it is plain data', () => {
    expect(structuredClone(full(1.2))).toEqual(full(1.2));
  });
});

describe('longer responses', () => {
  it('last to the end that all share, those of an unstable loop as long as it takes to grow', () => {
    const [calm, wild] = [full(1.2), full(60)];
    const ends = timeEnds([calm, wild]);
    expect(ends).toEqual(timeEnds([calm]));
    expect(ends.both).toBeGreaterThanOrEqual(endOfResponse(calm, 'load'));
    const until = doTask('lengthen', { loop: loop(1.2), analysis: calm, end: ends.both });
    expect([endOfResponse(until, 'reference'), endOfResponse(until, 'load')]).toEqual([ends.both, ends.both]);
    expect(doTask('lengthen', { loop: loop(60), analysis: wild, end: ends.both })).toBe(wild);
  });
});
