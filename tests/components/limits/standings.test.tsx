import { describe, expect, it } from 'vitest';
import { analyseLoop } from '@/analysis';
import { judgeLimit } from '@/analysis/project';
import { demandOf, rowOf } from '@/components/limits/model/demand-row';
import { rewriteDemand } from '@/components/limits/model/rewrite-demand';
import { standings } from '@/components/limits/model/standings';
import { startingSets } from '@/components/limits/model/starting-sets';
import { type KeptAnalysis, type Limit, Loop, PutLimits } from '@/contract';

const units = { magnitude: 'dB', frequency: 'rad/s' } as const;
const analysed = (kp: number) =>
  analyseLoop(
    Loop.parse({
      plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
      controller: { form: 'parallel', kp, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 },
    }),
  );

function kept(gains: readonly number[], { sampling = 'continuous' as const, basis = 'measured' as const } = {} as object as never) {
  const cases = gains.map((_, i) => ({ id: `case ${i}`, name: `case ${i}` }));
  return {
    inputs: { design: { sampling }, cases: cases.map(({ id }) => ({ id, plant: { deadTimeBasis: basis } })) },
    results: cases.map((place, i) => ({ case: place, verdict: 'pass', reason: null, checks: [], numbers: analysed(gains[i]) })),
  } as unknown as KeptAnalysis;
}
const demand = (quantity: Limit['quantity'], bound: Limit['bound'], limit: number): Limit => ({
  quantity,
  bound,
  limit,
  target: null,
  source: '',
});

describe('where the newest analysis stands to what is typed', () => {
  it('is the worst of its cases, with that case’s name', () => {
    const [worst] = standings(kept([1, 1.6, 1.2]), [demand('ms', 'max', 1.7)]);
    expect(worst.case.name).toBe('case 1');
    expect(worst.uses).toHaveLength(3);
    expect(worst.check.use).toBe(Math.max(...worst.uses));
  });

  it('is never green where nobody stated the sample time', () => {
    const analysis = kept([1]);
    const unstated = { ...analysis, inputs: { ...analysis.inputs, design: { ...analysis.inputs.design, sampling: null } } };
    expect(standings(analysis, [demand('ms', 'max', 3)])[0].check.verdict).toBe('pass');
    expect(standings(unstated, [demand('ms', 'max', 3)])[0].check.verdict).toBe('notJudged');
  });

  it('fails where a loop is not stable', () => {
    expect(standings(kept([1, 40]), [demand('phaseMargin', 'min', 5)])[0].check.verdict).toBe('fail');
  });
});

describe('a demand written as Ms or as modulus margin', () => {
  it('never changes a verdict, with the default target or a named one', () => {
    const numbers = Array.from({ length: 60 }, (_, i) => analysed(0.3 + i * 0.05));
    const changed: string[] = [];
    for (const limit of [1.3, 1.45, 1.6, 1.7, 2]) {
      for (const target of [null, limit - 0.07]) {
        const asMs = { ...demand('ms', 'max', limit), target };
        const asModulus = demandOf(rewriteDemand(rowOf(asMs, units), units))!;
        const back = demandOf(rewriteDemand(rowOf(asModulus, units), units))!;
        expect([asModulus.quantity, asModulus.bound]).toEqual(['modulusMargin', 'min']);
        for (const analysis of numbers) {
          const verdicts = [asMs, asModulus, back].map((written) => judgeLimit(written, analysis).verdict);
          if (new Set(verdicts).size > 1) changed.push(`${limit} ${target}: ${verdicts.join(', ')}`);
        }
      }
    }
    expect(changed).toEqual([]);
  });
});

describe('the starting sets', () => {
  it('are three, and each can be kept as it is', () => {
    expect(startingSets.map(({ name }) => name)).toEqual(['cautious first run', 'normal session', 'Ms only']);
    for (const { limits } of startingSets) expect(PutLimits.safeParse({ items: limits }).success).toBe(true);
  });

  it('ask more of a first run than of a session', () => {
    const [cautious, normal] = startingSets;
    for (const { quantity, limit } of normal.limits) {
      const stricter = cautious.limits.find((other) => other.quantity === quantity)!.limit;
      const least = quantity === 'phaseMargin' || quantity === 'gainMargin';
      expect(least ? stricter > limit : stricter < limit, quantity).toBe(true);
    }
  });
});
