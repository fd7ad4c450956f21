import * as fc from 'fast-check';
import { afterAll, beforeAll, beforeEach, expect, it, vi } from 'vitest';
import { analyseLoop, LoopError } from '@/analysis';
import { ContinuousLoop, MOST_EVALUATIONS } from '@/analysis/margins/continuous-loop';
import { MOST_WORK, WorkBudget } from '@/analysis/time/work-budget';
import { Analysis } from '@/contract';
import { hostileLoop } from './support/hostile-loops';

const RUNS = 100;

/** One step past a budget is what ends a computation: an exponential of the largest matrix at most. */
const LAST_STEP = 3e7;

let evaluations = 0;
let work = 0;
const { sampleAt } = ContinuousLoop.prototype;
const { spend } = WorkBudget.prototype;

beforeAll(() => {
  vi.spyOn(ContinuousLoop.prototype, 'sampleAt').mockImplementation(function (this: ContinuousLoop, ...sample) {
    evaluations += 1;
    sampleAt.apply(this, sample);
  });
  vi.spyOn(WorkBudget.prototype, 'spend').mockImplementation(function (this: WorkBudget, multiplyAdds) {
    work += multiplyAdds;
    spend.call(this, multiplyAdds);
  });
});
beforeEach(() => (evaluations = work = 0));
afterAll(() => vi.restoreAllMocks());

it(`every loop that the contract takes is answered without an infinity or refused, within its budget of steps (${RUNS} loops)`, () => {
  let answered = 0;
  fc.assert(
    fc.property(hostileLoop, (loop) => {
      evaluations = work = 0;
      try {
        Analysis.parse(analyseLoop(loop));
        answered += 1;
      } catch (error) {
        if (!(error instanceof LoopError)) throw error;
      }
      expect(evaluations).toBeLessThanOrEqual(MOST_EVALUATIONS + 1);
      expect(work).toBeLessThanOrEqual(MOST_WORK + LAST_STEP);
    }),
    { seed: 11, numRuns: RUNS, endOnFailure: true },
  );
  expect(answered).toBeGreaterThan(RUNS / 2);
}, 180_000);
