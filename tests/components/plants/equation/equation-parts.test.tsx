import { describe, expect, it } from 'vitest';
import { equationParts } from '@/components/plants/equation/equation-parts';
import { readBack } from '@/components/plants/equation/read-back';
import { spokenEquation } from '@/components/plants/equation/spoken-mathematics';
import type { PlantModel } from '@/contract';

const real = (re: number) => ({ re, im: 0 });
const pair = (re: number, im: number) => [
  { re, im },
  { re, im: -im },
];
const partsOf = (plant: PlantModel) => {
  const read = readBack({ plant });
  if (!read) throw new Error('no meaning');
  return equationParts(plant.kind, read);
};
const roots = (gain: number, zeros: ReturnType<typeof real>[], poles: ReturnType<typeof real>[], deadTime = 0): PlantModel => ({
  kind: 'roots',
  gain,
  zeros,
  poles,
  deadTime,
});

describe('a plant is typeset as it was given', () => {
  it.each<[PlantModel, string, string]>([
    [roots(2, [], [real(0), real(-0.5), ...pair(-0.5, Math.sqrt(8.75))]), '2', 's (s + 0.5)(s² + s + 9)'],
    [roots(1, [real(3)], [real(0), real(0), real(-1), real(-1)]), 's − 3', 's² (s + 1)²'],
    [roots(-1, [real(3)], [...pair(0, 3)]), '−(s − 3)', 's² + 9'],
    [roots(6, [real(0), ...pair(-1, 1)], [real(-1), ...pair(-1, 1)]), '6 s (s² + 2 s + 2)', '(s + 1)(s² + 2 s + 2)'],
    [roots(0.5, [], []), '0.5', '1'],
    [{ kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0 }, '2.1', '0.35 s² + s'],
  ])('%j', (plant, over, under) => {
    expect(partsOf(plant)).toEqual({ over, under, delay: null });
  });

  it('has no equation without a meaning or a reading', () => {
    expect(readBack({ plant: roots(1, [real(0)], []) })).toBeNull();
    expect(readBack({ plant: { kind: 'formula', text: '1/s', parameters: {} } })).toBeNull();
  });
});

describe('the equation is said aloud', () => {
  it('with its brackets, powers and signs as words', () => {
    expect(spokenEquation(partsOf(roots(2, [real(3)], [real(0), real(0), real(-1), real(-1)], 0.08)))).toBe(
      'P of s is 2 times open bracket s minus 3 close bracket, over s squared times open bracket s plus 1 close bracket squared, times e to the power of minus 0.08 s',
    );
  });

  it('without a line where there is nothing below it', () => {
    expect(spokenEquation({ over: '6', under: '1', delay: null })).toBe('P of s is 6');
  });
});
