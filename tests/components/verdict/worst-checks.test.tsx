import { describe, expect, it } from 'vitest';
import { mostPressing, worstChecks } from '@/components/verdict/worst-checks';
import type { Check, Verdict } from '@/contract';

const check = (use: number | null, verdict: Verdict): Check => ({
  quantity: 'ms',
  bound: 'max',
  limit: 1.7,
  target: 1.6,
  value: 1.5,
  use,
  verdict,
});
const results = (...checks: Check[]) => checks.map((one, index) => ({ case: { id: `${index}`, name: `case ${index}` }, checks: [one] }));

describe('the worst of each demand over all cases', () => {
  it('is the case nearest its limit, with the use of every case beside', () => {
    const [worst] = worstChecks(results(check(-2, 'pass'), check(0.4, 'tight'), check(0.1, 'tight')));
    expect(worst).toMatchObject({ case: { name: 'case 1' }, check: { use: 0.4 }, uses: [-2, 0.4, 0.1] });
  });

  it('is an unstable case before any number', () => {
    expect(worstChecks(results(check(0.9, 'tight'), check(null, 'fail')))[0].case.name).toBe('case 1');
  });

  it('is never a case without a finite limit while another has one', () => {
    const [worst] = worstChecks(results(check(null, 'pass'), check(-4, 'pass')));
    expect(worst.case.name).toBe('case 1');
    expect(worst.uses).toEqual([-4]);
  });

  it('is a case that could not be judged rather than one that passed', () => {
    expect(worstChecks(results(check(0.9, 'tight'), check(null, 'notJudged')))[0].case.name).toBe('case 1');
  });

  it('is nothing where nothing is demanded', () => {
    expect(worstChecks([{ case: { id: '0', name: 'nominal' }, checks: [] }])).toEqual([]);
  });
});

describe('where there is no room for every demand', () => {
  it('are those nearest their limits, in their own order', () => {
    const uses = [-3, 0.2, -1, 0.9];
    const demands = uses.map((use) => ({ check: check(use, 'pass'), case: { id: '0', name: 'nominal' }, uses: [use] }));
    expect(mostPressing(demands, 2).map(({ uses: [use] }) => use)).toEqual([0.2, 0.9]);
  });
});
