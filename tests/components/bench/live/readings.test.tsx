import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createLiveAnalyser } from '@/components/bench/live/live-analyser';
import { createReadings } from '@/components/bench/live/readings';

const source = () =>
  createLiveAnalyser<number, number>({
    compute: async (input) => input * 2,
    explain: String,
    rest: () => () => {},
  });

describe('what is read of the answers', () => {
  beforeEach(() => void vi.useFakeTimers());
  afterEach(() => void vi.useRealTimers());

  it('follows at a pace of its own and ends with the newest', async () => {
    const analyser = source();
    const readings = createReadings(analyser, (task) => void setTimeout(task, 0));
    const read: (number | null)[] = [];
    readings.subscribe(() => read.push(readings.get().output));
    for (let move = 1; move <= 20; move += 1) {
      analyser.ask(move);
      await vi.advanceTimersByTimeAsync(16);
    }
    await vi.advanceTimersByTimeAsync(200);
    expect(analyser.get().output).toBe(40);
    expect(read.at(-1)).toBe(40);
    expect(read.length).toBeGreaterThan(2);
    expect(read.length).toBeLessThan(7);
  });

  it('is not told of what changed after it left', async () => {
    const analyser = source();
    const readings = createReadings(analyser, (task) => task());
    let told = 0;
    readings.subscribe(() => (told += 1))();
    analyser.ask(1);
    await vi.advanceTimersByTimeAsync(200);
    expect(told).toBe(0);
  });
});
