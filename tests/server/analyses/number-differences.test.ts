import { describe, expect, it } from 'vitest';
import { numberDifferences } from '@/server/analyses/number-differences';

const kept = {
  closedLoop: { stable: true },
  margins: { gain: { factor: 2, frequency: null }, crossovers: [{ frequency: 3 }] },
  engineVersion: '1.0.0',
};

describe('differences between kept and recomputed numbers', () => {
  it('are none between equal results, whatever the engine calls itself', () => {
    expect(numberDifferences('nominal', { kept, now: { ...structuredClone(kept), engineVersion: '2.0.0' } }, 0)).toEqual([]);
  });

  it('name the case, the path and both numbers', () => {
    const now = structuredClone(kept);
    now.margins.crossovers[0].frequency = 3.1;
    expect(numberDifferences('wet', { kept, now }, 1e-9)).toEqual([
      { case: 'wet', quantity: 'margins.crossovers.0.frequency', kept: 3, now: 3.1 },
    ]);
  });

  it('forgive a relative tolerance and nothing without one', () => {
    const now = structuredClone(kept);
    now.margins.gain.factor = 2 * (1 + 5e-10);
    expect(numberDifferences('nominal', { kept, now }, 1e-9)).toEqual([]);
    expect(numberDifferences('nominal', { kept, now }, 0)).toHaveLength(1);
  });

  it('see a crossover come or go, a null become a number, and a loop lose its stability', () => {
    const now = { closedLoop: { stable: false }, margins: { gain: { factor: 2, frequency: 7 }, crossovers: [] } };
    expect(numberDifferences('nominal', { kept, now }, 1e-9)).toEqual([
      { case: 'nominal', quantity: 'closedLoop.stable', kept: 1, now: 0 },
      { case: 'nominal', quantity: 'margins.gain.frequency', kept: null, now: 7 },
      { case: 'nominal', quantity: 'margins.crossovers.0.frequency', kept: 3, now: null },
    ]);
  });
});
