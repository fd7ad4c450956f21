import { describe, expect, it } from 'vitest';
import { LoopError } from '@/analysis';
import { continuousLoops } from '../support/reference-loops';
import { coefficients, frequencyNumbersOf, pid, roots } from '../support/cast';

describe('what an analysis costs', () => {
  const rational = continuousLoops.filter(({ loop }) => loop.plant.kind === 'coefficients' && !loop.plant.deadTime);

  it.each(rational)('$id: at most 2,500 evaluations without dead time', ({ loop }) => {
    expect(frequencyNumbersOf(loop.plant, loop.controller).evaluations).toBeLessThan(2500);
  });

  it('a few thousand for hundreds of crossovers', () => {
    const { evaluations, margins } = frequencyNumbersOf(coefficients([2.65], [3.84, 1], 2.66), pid(0.9822));
    expect(margins.phaseCrossovers).toHaveLength(287);
    expect(evaluations).toBeLessThan(12_000);
  });
});

describe('a loop that would take too long', () => {
  it.each([
    ['10,000 s of dead time before a pole of a microsecond', coefficients([1], [1e-6, 1], 1e4)],
    ['10,000 s of dead time in a fast integrator', coefficients([1], [1, 0], 1e4)],
    ['dead time beside a resonance at a gigahertz', roots(1e18, { poles: [[-1, 1e9]] }, 1)], // prettier-ignore
  ])('%s is refused within a second, at the dead time', (_, plant) => {
    const start = performance.now();
    expect(() => frequencyNumbersOf(plant, pid(5, 1))).toThrow(LoopError);
    expect(performance.now() - start).toBeLessThan(1000);
  });
});
