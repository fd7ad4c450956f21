import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { circleKerb, closedKerb, outlineLength, straightKerb } from '@/figures/kerb';

const corners = (path: string): { x: number; y: number }[] =>
  path
    .split(/[MLZ]/)
    .filter((part) => part !== '')
    .map((part) => {
      const [x, y] = part.trim().split(' ').map(Number);
      return { x, y };
    });

describe('a straight kerb', () => {
  it('has whole blocks, the first of them red, whatever its length', () => {
    fc.assert(
      fc.property(fc.double({ min: 4, max: 900, noNaN: true }), fc.double({ min: 6, max: 12, noNaN: true }), (length, block) => {
        const { blocks, count } = straightKerb({ from: { x: 10, y: 50 }, to: { x: 10 + length, y: 50 }, block, side: 'right' });
        const reds = corners(blocks);
        expect(reds.length).toBe(4 * Math.ceil(count / 2));
        expect(reds[0]).toEqual({ x: 10, y: 50 });
        for (let i = 0; i < reds.length; i += 4) expect(reds[i + 1].x - reds[i].x).toBeCloseTo(length / count, 1);
      }),
    );
  });

  it('lies beyond its line, on the forbidden side only', () => {
    const line = { from: { x: 0, y: 100 }, to: { x: 80, y: 100 } };
    const below = corners(straightKerb({ ...line, side: 'right' }).ground);
    const above = corners(straightKerb({ ...line, side: 'left' }).ground);
    expect(below.every(({ y }) => y >= 100 && y <= 106)).toBe(true);
    expect(above.every(({ y }) => y <= 100 && y >= 94)).toBe(true);
  });
});

describe('a kerb round a closed limit', () => {
  it('of a circle has an even count of equal blocks that close the ring, inside the limit', () => {
    fc.assert(
      fc.property(fc.double({ min: 2, max: 400, noNaN: true }), (radius) => {
        const kerb = circleKerb(radius);
        expect(kerb.count % 2).toBe(0);
        expect(kerb.dash * kerb.count).toBeCloseTo(2 * Math.PI * kerb.middle, 6);
        expect(kerb.middle + kerb.width / 2).toBeCloseTo(radius, 9);
        expect(kerb.inner).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it('of any outline closes too', () => {
    const square = [
      { x: 0, y: 0 },
      { x: 40, y: 0 },
      { x: 40, y: 40 },
      { x: 0, y: 40 },
    ];
    const kerb = closedKerb(square);
    expect(outlineLength(square)).toBe(160);
    expect(kerb.count % 2).toBe(0);
    expect(kerb.dash * kerb.count).toBeCloseTo(160, 9);
  });
});
