import { describe, expect, it } from 'vitest';
import { startSettings } from '@/components/bench/draft/settings';
import { markWalk } from '@/components/bench/over/mark-walk';

const ends = (kp: number, side: 'down' | 'up') => {
  const walk = markWalk({ ...startSettings, kp }, 'kp', side);
  return walk && [walk.valueAt(walk.from), walk.valueAt(walk.to)];
};

describe('the way that a gain is walked', () => {
  it('leads thirty times up and a thirtieth down', () => {
    expect(ends(1.2, 'up')).toEqual([1.2, expect.closeTo(36)]);
    expect(ends(1.2, 'down')).toEqual([1.2, expect.closeTo(0.04)]);
  });

  it('leads a negative gain towards 0 when it is turned up', () => {
    expect(ends(-3, 'up')).toEqual([-3, expect.closeTo(-0.1)]);
    expect(ends(-3, 'down')).toEqual([-3, expect.closeTo(-90)]);
  });

  it('leaves 0 to both sides, except for a time', () => {
    expect(markWalk({ ...startSettings, kp: 2 }, 'derivative', 'down')).toMatchObject({ from: 0, to: -2 });
    expect(markWalk(startSettings, 'filterTime', 'down')).toBeNull();
    expect(markWalk(startSettings, 'filterTime', 'up')).toMatchObject({ from: 0, to: 1 });
  });

  it('is none without integral action', () => {
    expect(markWalk({ ...startSettings, form: 'ideal', integral: null }, 'integral', 'up')).toBeNull();
  });
});
