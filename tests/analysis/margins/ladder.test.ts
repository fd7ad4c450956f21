import { expect, it } from 'vitest';
import { ladder } from '@/analysis/margins/ladder';

it('a ladder climbs evenly from end to end, with every landmark between and none twice', () => {
  const frequencies = ladder(0.1, 1000, { pointsPerDecade: 3, landmarks: [0.01, 0.1, 2, 2, 70, 1000, 5000] });
  expect(frequencies[0]).toBe(0.1);
  expect(frequencies.at(-1)).toBe(1000);
  expect(frequencies).toHaveLength(4 * 3 + 1 + 2);
  expect(frequencies.filter((omega) => omega === 2 || omega === 70)).toEqual([2, 70]);
  for (let i = 1; i < frequencies.length; i += 1) {
    expect(frequencies[i]).toBeGreaterThan(frequencies[i - 1]);
    expect(frequencies[i] / frequencies[i - 1]).toBeLessThan(10 ** (1 / 3) * (1 + 1e-12));
  }
});
