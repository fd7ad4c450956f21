import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contains, grow } from '@/figures/geometry';
import { frequencyAtPlace, nearestPlace } from '@/figures/nearest-point';
import { polylinePath, thinned, toPolyline } from '@/figures/polyline';

const bounds = { x: 0, y: 0, width: 100, height: 100 };
const itself = (value: number) => value;
const points = (path: string) =>
  path
    .split(/[ML]/)
    .filter((part) => part !== '')
    .map((part) => part.split(' ').map(Number));

describe('polylinePath', () => {
  it('never leaves the picture by more than a stroke, whatever the curve', () => {
    const value = fc.double({ min: -1e9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(fc.array(fc.tuple(value, value), { minLength: 2, maxLength: 40 }), (curve) => {
        const line = toPolyline(
          curve.map(([x]) => x),
          curve.map(([, y]) => y),
          itself,
          itself,
        );
        points(polylinePath(line, bounds)).forEach(([x, y]) => expect(contains(grow(bounds, 6.01), { x, y })).toBe(true));
      }),
    );
  });

  it('parts at a point that is not finite', () => {
    const line = toPolyline([10, 20, NaN, 40, 50], [10, 10, 10, 10, 10], itself, itself);
    expect(polylinePath(line, bounds)).toBe('M10 10L20 10M40 10L50 10');
  });

  it('joins what comes back into the picture where it enters', () => {
    const line = toPolyline([50, 50, 60, 60], [50, 500, 500, 50], itself, itself);
    expect(polylinePath(line, bounds)).toBe('M50 50L50 106M60 106L60 50');
  });

  it('leaves out what a screen cannot show, and keeps the end', () => {
    const x = Array.from({ length: 1001 }, (_, i) => i / 100);
    const path = polylinePath(toPolyline(x, x, itself, itself), bounds);
    expect(points(path).length).toBeLessThan(30);
    expect(points(path).at(-1)).toEqual([10, 10]);
  });
});

describe('a path of few points', () => {
  const bow = Array.from({ length: 400 }, (_, i) => 50 + 40 * Math.sin(i / 60));
  const line = toPolyline(
    bow.map((_, i) => i / 4),
    bow,
    itself,
    itself,
  );
  const path = points(polylinePath(line, bounds));

  it('needs a quarter of those of the curve, and passes all of them within a tenth of a pixel', () => {
    expect(path.length).toBeLessThan(100);
    const drawn = toPolyline(
      path.map(([x]) => x),
      path.map(([, y]) => y),
      itself,
      itself,
    );
    // A written coordinate is itself rounded to a hundredth.
    bow.forEach((y, i) => expect(nearestPlace(drawn, { x: i / 4, y })!.distance).toBeLessThan(0.1 + 0.01));
  });

  it('keeps the tip of a curve that turns back on itself', () => {
    expect(polylinePath(toPolyline([10, 20, 30, 20], [10, 10, 10, 10], itself, itself), bounds)).toBe('M10 10L30 10L20 10');
  });
});

describe('remember', () => {
  it('makes anew what stands elsewhere, and nothing twice in the same place', () => {
    const line = toPolyline([10, 20], [10, 10], itself, itself);
    expect(thinned(line, bounds)).toBe(thinned(line, { ...bounds }));
    expect(thinned(line, { ...bounds, width: 12 })).not.toEqual(thinned(line, bounds));
  });
});

describe('thinned', () => {
  it('keeps to the curve inside the picture', () => {
    const line = thinned(toPolyline([-500, 500], [50, 50], itself, itself), bounds);
    expect(Math.min(...line.x)).toBeCloseTo(-6, 9);
    expect(Math.max(...line.x)).toBeCloseTo(106, 9);
    expect([...line.y].every((y) => y === 50)).toBe(true);
  });
});

describe('nearestPlace', () => {
  it('gives the frequency of the nearest point of a curve', () => {
    const line = toPolyline([0, 100, 100], [0, 0, 100], itself, itself);
    const place = nearestPlace(line, { x: 120, y: 50 });
    expect(place).toMatchObject({ index: 1, fraction: 0.5, distance: 20 });
    expect(frequencyAtPlace([1, 10, 1000], place ?? { index: 0, fraction: 0, distance: 0 })).toBeCloseTo(100, 9);
  });
});
