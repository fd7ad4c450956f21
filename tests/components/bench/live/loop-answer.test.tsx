import { describe, expect, it } from 'vitest';
import { answerLoop, answerUntil } from '@/components/bench/live/loop-answer';
import { timeEnds } from '@/components/bench/live/time-ends';
import { Loop } from '@/contract';
import { endOfResponse } from '@/figures';

const loop = (kp: number) =>
  Loop.parse({
    plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
    controller: { form: 'parallel', kp, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 },
  });

describe('the answer to a loop', () => {
  it('as an outline has the numbers of the whole, and no responses', () => {
    const outline = answerLoop(loop(1.2), 'outline').analysis;
    const full = answerLoop(loop(1.2), 'full').analysis;
    expect(outline.timeResponse).toBeNull();
    expect(outline.sensitivity.ms.value).toBeCloseTo(full.sensitivity.ms.value, 8);
    expect(outline.margins.phase!.degrees).toBeCloseTo(full.margins.phase!.degrees, 6);
  });

  it('adds to an outline the same coarse responses as it gives without', () => {
    const outline = answerLoop(loop(1.2), 'outline');
    const added = answerLoop(loop(1.2), 'live', { outline, end: 9 }).analysis;
    expect(added).toEqual(answerLoop(loop(1.2), 'live', { end: 9 }).analysis);
    expect(endOfResponse(added, 'load')).toBe(9);
  });

  it('lasts to the end that all share, an unstable one as long as it takes to grow', () => {
    const [calm, wild] = [answerLoop(loop(1.2), 'full'), answerLoop(loop(60), 'full')];
    const ends = timeEnds([calm.analysis, wild.analysis]);
    expect(ends).toEqual(timeEnds([calm.analysis]));
    expect(ends.both).toBeGreaterThanOrEqual(endOfResponse(calm.analysis, 'load'));
    const until = answerUntil(calm, ends.both).analysis;
    expect([endOfResponse(until, 'reference'), endOfResponse(until, 'load')]).toEqual([ends.both, ends.both]);
    expect(answerUntil(wild, ends.both)).toBe(wild);
  });
});
