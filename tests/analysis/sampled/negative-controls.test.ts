import { describe, expect, it } from 'vitest';
import { analyseLoop } from '@/analysis';
import { resolveFormula } from '@/analysis/formula';
import { Loop } from '@/contract';
import { referenceLoops } from '../support/reference-loops';

/** Tolerances of the reference test: what an approximation must not pass. */
const RELATIVE = 1e-6;
const DEGREES = 1e-5;

const sampled = referenceLoops.filter(({ loop }) => loop.sampling);

describe.each(sampled)('half a sample of dead time in place of the hold: $id', ({ loop, expect: want }) => {
  it('misses the margins of the loop that the computer runs', () => {
    const { period, computationDelay = 0 } = loop.sampling!;
    const input = resolveFormula(Loop.parse({ ...loop, sampling: null }));
    const { deadTime } = input.plant as { deadTime: number };
    const approximate = { ...input, plant: { ...input.plant, deadTime: deadTime + computationDelay + period / 2 } as Loop['plant'] };
    const { margins, sensitivity } = analyseLoop(approximate, { curves: false, responses: false });
    const misses = [
      want.phase !== null && Math.abs((margins.phase?.degrees ?? Infinity) - want.phase.degrees) > DEGREES,
      want.gain !== null && Math.abs((margins.gain?.factor ?? Infinity) / want.gain.factor - 1) > RELATIVE,
      Math.abs(sensitivity.ms.value / want.ms.value - 1) > RELATIVE,
    ];
    expect(misses).toContain(true);
    expect(Math.abs(sensitivity.ms.value / want.ms.value - 1)).toBeGreaterThan(100 * RELATIVE);
  });
});

describe('phase margin over frequency in place of the exact delay margin', () => {
  it('is off by a tenth where the crossover is near half the sampling frequency', () => {
    const { loop, expect: want } = sampled.find(({ id }) => id === 'sampled-18')!;
    const { margins } = analyseLoop(Loop.parse(loop), { curves: false, responses: false });
    const naive = (margins.phase!.degrees * Math.PI) / 180 / margins.phase!.frequency;
    expect(Math.abs(margins.delay!.seconds / want.delay!.seconds - 1)).toBeLessThan(RELATIVE);
    expect(Math.abs(naive / want.delay!.seconds - 1)).toBeGreaterThan(0.05);
  });
});
