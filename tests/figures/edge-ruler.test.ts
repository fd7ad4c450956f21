import { describe, expect, it } from 'vitest';
import { edgeRuler } from '@/figures/edge-ruler';

const ruler = (uses: number[], worst: number, width = 366) => edgeRuler({ width, height: 50, uses, worst, hasTarget: true, named: true });

describe('edgeRuler', () => {
  it('puts target and limit at the same share of every width', () => {
    const [narrow, wide] = [ruler([], 0, 140), ruler([], 0, 366)];
    const share = (x: number, width: number) => (x - 14) / (width - 22);
    expect(share(narrow.target, 140)).toBeCloseTo(6 / 7.6, 12);
    expect(share(wide.target, 366)).toBeCloseTo(6 / 7.6, 12);
    expect(share(wide.limit, 366)).toBeCloseTo(7 / 7.6, 12);
  });

  it('stands the needle in the kerb past the limit, and at the end beyond the scale', () => {
    const past = ruler([1.2], 1.2);
    expect(past.needle).toBeGreaterThan(past.limit);
    expect(ruler([40], 40).needle).toBe(366 - 8);
    expect(ruler([40], 40).offRight).toBe(true);
  });

  it('tells of cases off the scale without counting them', () => {
    const shape = ruler([-50, -9, -2, 0.5], 0.5);
    expect(shape.offLeft).toBe(true);
    expect(shape.ticks).toHaveLength(2);
  });
});
