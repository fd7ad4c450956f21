import { describe, expect, it } from 'vitest';
import { roomLines, roomSentence } from '@/components/verdict/room-lines';
import type { FirstBreak, Room, RoomWay } from '@/contract';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const slow = { id: 'slow', name: '30 km/h' };
const ms = (amount: number): FirstBreak => ({ amount, quantity: 'ms', limit: 1.7, case: slow });
const way = (any: FirstBreak | null, lookedTo: number): RoomWay => ({ lookedTo, any, stability: any, instability: null });
const room = (change: Partial<Room> = {}): Room => ({
  moreGain: way(ms(1.07), 100),
  lessGain: way({ amount: 0.76, quantity: 'settlingTime', limit: 6, case: slow }, 0.01),
  moreDeadTime: way(ms(0.016), 10),
  ...change,
});
const said = (change?: Partial<Room>) => roomLines(room(change), units).map(({ change: much, before }) => `${much} ${before}`.trim());

describe('room in words', () => {
  it('says how much of each, and which limit breaks first', () => {
    expect(said()).toEqual(['7 % more gain before Ms 1.70', '24 % less gain before Settling 6 s', '16 ms more dead time before Ms 1.70']);
  });

  it('is one sentence where there is room for one, and says together what breaks at the same limit', () => {
    const lines = roomLines(room(), units).map((line) => ({ ...line, caseName: null }));
    expect(roomSentence(lines)).toBe('7 % more gain or 16 ms more dead time before Ms 1.70; 24 % less gain before Settling 6 s.');
  });

  it('never rounds up', () => {
    const [gain, , delay] = said({ moreGain: way(ms(1.0799), 100), moreDeadTime: way(ms(0.01699), 10) });
    expect([gain, delay]).toEqual(['7 % more gain before Ms 1.70', '16 ms more dead time before Ms 1.70']);
  });

  it('speaks of times from twice the gain on', () => {
    expect(said({ moreGain: way(ms(3.4567), 100) })[0]).toBe('3.45 times more gain before Ms 1.70');
  });

  it('says how far was looked where nothing broke', () => {
    expect(said({ moreDeadTime: way(null, 10) })[2]).toBe('over 10,000 ms more dead time');
  });

  it('says none where the limit is reached or passed, or the loop is unstable as it is', () => {
    expect(said({ moreGain: way(ms(1), 100) })[0]).toBe('no more gain within Ms 1.70');
    const unstable: FirstBreak = { amount: 0, quantity: null, limit: null, case: slow };
    expect(said({ moreDeadTime: way(unstable, 10) })[2]).toBe('no more dead time without being unstable');
  });

  it('keeps its places while it is looked for', () => {
    expect(roomLines('sought', units).map(({ change }) => change)).toEqual(['… more gain', '… less gain', '… more dead time']);
  });

  it('names the edge of stability where no limit comes before', () => {
    const unstable: FirstBreak = { amount: 1.5, quantity: null, limit: null, case: slow };
    expect(said({ moreGain: { ...way(null, 100), instability: unstable } })[0]).toBe('50 % more gain before it is unstable');
  });
});
