import { describe, expect, it } from 'vitest';
import { parseRoots } from '@/components/plants/notation/parse-roots';
import { rootsText } from '@/components/plants/notation/root-text';

const pair = [
  { re: -0.5, im: 3 },
  { re: -0.5, im: -3 },
];
const real = (...values: number[]) => values.map((re) => ({ re, im: 0 }));
const undamped = [
  { re: 0, im: 3 },
  { re: 0, im: -3 },
];

describe('poles and zeros are read as people write them', () => {
  it.each([
    ['', []],
    ['  ', []],
    ['-2', real(-2)],
    ['−2, 0', real(-2, 0)],
    ['-2,-3', real(-2, -3)],
    ['-2 -3', real(-2, -3)],
    ['0 0 -1e-3', real(0, 0, -0.001)],
    ['+4', real(4)],
    ['-2,5; -3', real(-2.5, -3)],
    ['-2, -0.5±3i', [...real(-2), ...pair]],
    ['-0.5 ± 3j', pair],
    ['-0.5 +/- 3 i', pair],
    ['-0.5+-3i', pair],
    ['-0,5 ± 3i; -2', [...pair, ...real(-2)]],
    ['-0.5+3i, -0.5-3i', pair],
    ['-0.5 + 3i -0.5 - 3i', pair],
    ['−0.5 − 3i; −0.5 + 3i', [...pair].reverse()],
    ['±3i', undamped],
    ['3i, -3i', undamped],
    ['-1 ± i', [{ re: -1, im: 1 }, { re: -1, im: -1 }]], // prettier-ignore
    ['-1 ± 0i', real(-1)],
    ['-2,', real(-2)],
  ])('%s', (text, roots) => {
    expect(parseRoots(text)).toEqual({ roots });
  });

  it.each([
    ['-0.5 + 3i', '−0.5 + 3i stands alone. Write the pair as −0.5 ± 3i, or add −0.5 − 3i.'],
    ['-2, -0.5 - 3i', '−0.5 − 3i stands alone. Write the pair as −0.5 ± 3i, or add −0.5 + 3i.'],
    ['3i', '3i stands alone. Write the pair as ±3i, or add −3i.'],
    ['-0.5+3i, -0.5-3.1i', '−0.5 + 3i stands alone. Write the pair as −0.5 ± 3i, or add −0.5 − 3i.'],
    ['-2, two', '“two” is not a root. Write it as in −2 or −0.5 ± 3i.'],
    ['-2x', '“-2x” is not a root. Write it as in −2 or −0.5 ± 3i.'],
    ['-2,,-3', 'A root is missing between two commas.'],
    ['(-2)', '“(-2)” is not a root. Write it as in −2 or −0.5 ± 3i.'],
  ])('%s is refused, naming the root', (text, problem) => {
    expect(parseRoots(text)).toEqual({ problem });
  });

  it('reads back what it prints', () => {
    const roots = [...real(-2, 0, 1e-7), ...pair, ...undamped];
    const text = rootsText(roots);
    expect(text).toBe('−2, 0, 1e−7, −0.5 ± 3i, ±3i');
    expect(parseRoots(text)).toEqual({ roots });
  });
});
