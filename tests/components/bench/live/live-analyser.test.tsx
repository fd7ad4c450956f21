import { describe, expect, it } from 'vitest';
import { createLiveAnalyser, type Detail, type Schedule } from '@/components/bench/live/live-analyser';

/** A clock that the test turns by hand. */
function handSchedule() {
  const waiting = { frame: [] as (() => void)[], rest: [] as (() => void)[] };
  const enter = (kind: 'frame' | 'rest') => (task: () => void) => {
    waiting[kind].push(task);
    return () => void (waiting[kind] = waiting[kind].filter((other) => other !== task));
  };
  const turn = (kind: 'frame' | 'rest') => () => waiting[kind].splice(0).forEach((task) => task());
  const schedule: Schedule = { frame: enter('frame'), rest: enter('rest') };
  return { schedule, frame: turn('frame'), rest: turn('rest'), waiting };
}

function bench(compute = (input: number) => input * 2, steps?: () => readonly Detail[]) {
  const clock = handSchedule();
  const calls: [number, Detail][] = [];
  const analyser = createLiveAnalyser<number, number>({
    compute(input, detail) {
      calls.push([input, detail]);
      return compute(input);
    },
    ...(steps && { steps }),
    explain(error) {
      if (error instanceof RangeError) return error.message;
      throw error;
    },
    schedule: clock.schedule,
  });
  return { ...clock, analyser, calls };
}

describe('the live analyser', () => {
  it('computes the newest of all that came within a frame, once', () => {
    const { analyser, calls, frame } = bench();
    [1, 2, 3].forEach(analyser.ask);
    frame();
    expect(calls).toEqual([[3, 'live']]);
    expect(analyser.get()).toMatchObject({ input: 3, output: 6, detail: 'live', problem: null });
  });

  it('computes in full when the gain rests, and only then', () => {
    const { analyser, calls, frame, rest } = bench();
    analyser.ask(1);
    frame();
    analyser.ask(2);
    rest();
    expect(calls).toEqual([[1, 'live']]);
    frame();
    rest();
    expect(calls.slice(1)).toEqual([
      [2, 'live'],
      [2, 'full'],
    ]);
    expect(analyser.get().detail).toBe('full');
  });

  it('asks nothing twice', () => {
    const { analyser, calls, frame, rest } = bench();
    analyser.ask(1);
    frame();
    rest();
    analyser.ask(1);
    frame();
    rest();
    expect(calls).toHaveLength(2);
  });

  it('leaves the previous answer standing beside a problem, and recovers', () => {
    const { analyser, frame, rest, calls } = bench((input) => {
      if (input < 0) throw new RangeError('Tf is 0 or more.');
      return input * 2;
    });
    analyser.ask(1);
    frame();
    rest();
    analyser.ask(-1);
    frame();
    rest();
    expect(analyser.get()).toMatchObject({ input: -1, output: 2, problem: 'Tf is 0 or more.' });
    expect(calls.filter(([input]) => input < 0)).toHaveLength(1);
    analyser.ask(4);
    frame();
    expect(analyser.get()).toMatchObject({ output: 8, problem: null });
  });

  it('does not hide an error that is not the engine’s', () => {
    const { analyser, frame } = bench(() => {
      throw new TypeError('a defect');
    });
    analyser.ask(1);
    expect(frame).toThrow('a defect');
  });

  it('tells those who listen, and computes nothing after it was stopped', () => {
    const { analyser, frame, rest, calls } = bench();
    let told = 0;
    const leave = analyser.subscribe(() => (told += 1));
    analyser.ask(1);
    frame();
    leave();
    rest();
    expect(told).toBe(1);
    analyser.ask(2);
    analyser.stop();
    frame();
    rest();
    expect(calls.map(([input]) => input)).toEqual([1, 1]);
  });

  it('ends what it began before it takes up a newer input, so that moves at the rate of frames starve no step', () => {
    const { analyser, calls, frame } = bench(undefined, () => ['outline', 'live']);
    for (const input of [1, 2, 3, 4]) {
      analyser.ask(input);
      frame();
    }
    expect(calls).toEqual([
      [1, 'outline'],
      [1, 'live'],
      [3, 'outline'],
      [3, 'live'],
    ]);
    frame();
    expect(calls.at(-1)).toEqual([4, 'outline']);
  });

  it('keeps the newest complete answer beside an outline, and the newest full one while a gain moves', () => {
    const { analyser, frame, rest } = bench(undefined, () => ['outline', 'live']);
    analyser.ask(1);
    frame();
    expect(analyser.get()).toMatchObject({ output: 2, complete: null, rested: null });
    frame();
    rest();
    analyser.ask(5);
    frame();
    expect(analyser.get()).toMatchObject({ output: 10, complete: 2, rested: 2, detail: 'outline' });
    frame();
    expect(analyser.get()).toMatchObject({ output: 10, complete: 10, rested: 2, detail: 'live' });
  });
});
