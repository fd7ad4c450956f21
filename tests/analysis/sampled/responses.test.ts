import { describe, expect, it } from 'vitest';
import { analyseLoop, buildLoop } from '@/analysis';
import { respondSampled } from '@/analysis/sampled/sampled-responses';
import { Loop } from '@/contract';
import { referenceLoops } from '../support/reference-loops';

/** The fixture's responses were computed with 12 digits. */
const OF_PEAK = 1e-10;

const timed = referenceLoops.filter(({ loop, time }) => loop.sampling && time);

describe.each(timed)('$id: $title', ({ loop, time }) => {
  const input = Loop.parse(loop);
  const model = buildLoop(input);
  const { times, reference, load, metrics } = time!;

  it('answers a reference and a load step as the reference does, at the samples', () => {
    const steps = respondSampled(model, model.sampled!, { stable: true, duration: Math.max(...times) });
    if (typeof steps === 'string') throw new Error(steps);
    for (const [curve, want] of [
      [steps.reference.output, reference],
      [steps.load.output, load],
    ] as const) {
      const peak = Math.max(...want.map(Math.abs));
      times.forEach((t, i) => expect(Math.abs(curve.valueAt(t) - want[i])).toBeLessThanOrEqual(OF_PEAK * peak));
    }
  });

  it('ends where the gain at z = 1 says', () => {
    const { steadyStateError } = analyseLoop(input, { curves: false }).timeResponse!.metrics!;
    expect(steadyStateError).toBeCloseTo(metrics.steadyStateError!, 10);
  });
});
