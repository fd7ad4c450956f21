import { describe, expect, it } from 'vitest';
import { createLabelBoard } from '@/figures/label-board';
import { placeLabel, placesAround } from '@/figures/place-label';
import { toPolyline } from '@/figures/polyline';

const bounds = { x: 0, y: 0, width: 300, height: 200 };
const itself = (value: number) => value;
const xs = Array.from({ length: 101 }, (_, i) => 3 * i);
const level = toPolyline(
  xs,
  xs.map(() => 100),
  itself,
  itself,
);

describe('labels', () => {
  it('keep off curves and inside the picture', () => {
    const { box } = placeLabel(['Ms 1.63'], placesAround({ x: 290, y: 100 }, [12, 20]), { bounds, curves: [level], taken: [] });
    expect(box.y > 100 || box.y + box.height < 100).toBe(true);
    expect(box.x + box.width).toBeLessThanOrEqual(300);
  });

  it('keep off each other', () => {
    const board = createLabelBoard({ bounds, curves: [level] });
    const boxes = [1, 2, 3].map((i) => board.add([`label ${i}`], 'quiet', placesAround({ x: 150, y: 100 }, [12, 24, 40])).box);
    boxes.forEach((a, i) =>
      boxes.slice(i + 1).forEach((b) => {
        expect(a.x + a.width <= b.x || b.x + b.width <= a.x || a.y + a.height <= b.y || b.y + b.height <= a.y).toBe(true);
      }),
    );
  });

  it('take the first place that is free', () => {
    const places = placesAround({ x: 150, y: 40 }, [12]);
    expect(placeLabel(['1'], places, { bounds, curves: [level], taken: [] })).toMatchObject(places[0]);
  });
});
