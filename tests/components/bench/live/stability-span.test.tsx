import { describe, expect, it } from 'vitest';
import { stabilitySpan } from '@/components/bench/live/stability-span';

function spanOf(value: number, stableAt: (value: number) => boolean, size = 1) {
  let looks = 0;
  const search = stabilitySpan({
    value,
    size,
    stableAt(at) {
      looks += 1;
      return stableAt(at);
    },
  });
  let step = search.next();
  while (!step.done) step = search.next();
  return { span: step.value, looks };
}

describe('the span of stable gains', () => {
  it('ends where a gain becomes too large, to the two figures that are printed', () => {
    const { span } = spanOf(1, (kp) => kp > -1 && kp < 3.5);
    expect(span.above).toBeCloseTo(3.5, 1);
    expect(Math.abs(span.above! / 3.5 - 1)).toBeLessThan(2e-3);
  });

  it('is open where nothing unstable lies within nearly thirty times the gain', () => {
    expect(spanOf(1, () => true).span).toEqual({});
  });

  it('ends on both sides of a conditionally stable loop', () => {
    const { span } = spanOf(1, (kp) => kp > 0.18 && kp < 3.5);
    expect(Math.abs(span.below! / 0.18 - 1)).toBeLessThan(3e-3);
  });

  it('runs through zero for a negative gain', () => {
    const { span } = spanOf(-0.05, (kd) => kd > -0.36 && kd < 0);
    expect(span.above).toBe(0);
    expect(Math.abs(span.below! / -0.36 - 1)).toBeLessThan(3e-3);
  });

  it('is looked for on both sides of zero', () => {
    const { span } = spanOf(0, (ki) => ki > -0.02 && ki < 2.2);
    expect(Math.abs(span.above! / 2.2 - 1)).toBeLessThan(2e-3);
    expect(span.below! / -0.02).toBeCloseTo(1, 1);
  });

  it('is zero where a gain of zero must not change its sign', () => expect(spanOf(0, (ki) => ki >= 0).span.below).toBe(0));

  it('has nothing to say of a loop that is unstable to begin with', () => expect(spanOf(1, () => false).span).toEqual({}));

  it('takes a bounded number of looks', () => expect(spanOf(1, (kp) => kp > 0.05 && kp < 25).looks).toBeLessThan(45));
});
