import { describe, expect, it } from 'vitest';
import type { Detail } from '@/components/bench/engine/engine-tasks';
import { createLiveAnalyser } from '@/components/bench/live/live-analyser';

interface Task {
  readonly input: number;
  readonly detail: Detail;
  end(): Promise<void>;
}

/** Lets everything that waits for a settled promise go on. */
const settled = () => new Promise<void>((resolve) => setTimeout(resolve, 0));

/** An engine whose tasks end when the test says so, and a clock that it turns by hand. */
function bench({ compute = (input: number) => input * 2, steps = ['live'] as readonly Detail[] } = {}) {
  const begun: Task[] = [];
  let resting: (() => void)[] = [];
  const analyser = createLiveAnalyser<number, number>({
    compute: (input, detail) =>
      new Promise((resolve, reject) => {
        const end = () => {
          begun.splice(begun.indexOf(task), 1);
          try {
            resolve(compute(input));
          } catch (error) {
            reject(error);
          }
          return settled();
        };
        const task = { input, detail, end };
        begun.push(task);
      }),
    steps: () => steps,
    explain(error) {
      if (error instanceof RangeError) return error.message;
      throw error;
    },
    rest(task) {
      resting.push(task);
      return () => void (resting = resting.filter((other) => other !== task));
    },
  });
  const rest = () => resting.splice(0).forEach((task) => task());
  const under = (detail: Detail) => begun.find((task) => task.detail === detail)!;
  const order = () => begun.map(({ input, detail }) => [input, detail]);
  return { analyser, begun, order, under, rest };
}

describe('the live analyser', () => {
  it('begins at once, and of all that come meanwhile takes up the newest alone', async () => {
    const { analyser, order, under } = bench();
    [1, 2, 3].forEach(analyser.ask);
    expect(order()).toEqual([[1, 'live']]);
    await under('live').end();
    expect(analyser.get()).toMatchObject({ input: 1, output: 2 });
    expect(order()).toEqual([[3, 'live']]);
    await under('live').end();
    expect(analyser.get()).toMatchObject({ input: 3, output: 6, detail: 'live', problem: null });
    expect(order()).toEqual([]);
  });

  it('computes in full when the gain rests, and only then', async () => {
    const { analyser, order, under, rest } = bench();
    analyser.ask(1);
    analyser.ask(2);
    await under('live').end();
    await under('live').end();
    expect(order()).toEqual([]);
    rest();
    expect(order()).toEqual([[2, 'full']]);
    await under('full').end();
    expect(analyser.get()).toMatchObject({ detail: 'full', output: 4, rested: 4 });
  });

  it('asks nothing twice', () => {
    const { analyser, order } = bench();
    analyser.ask(1);
    analyser.ask(1);
    expect(order()).toHaveLength(1);
  });

  it('does not rest on a full answer to what has moved on meanwhile', async () => {
    const { analyser, under, rest } = bench();
    analyser.ask(1);
    await under('live').end();
    rest();
    const late = under('full');
    analyser.ask(2);
    await under('live').end();
    await late.end();
    expect(analyser.get()).toMatchObject({ input: 2, output: 4, rested: null, detail: 'live' });
  });

  it('leaves the previous answer standing beside a problem, and recovers', async () => {
    const { analyser, order, under, rest } = bench({
      compute(input) {
        if (input < 0) throw new RangeError('Tf is 0 or more.');
        return input * 2;
      },
    });
    analyser.ask(1);
    await under('live').end();
    analyser.ask(-1);
    await under('live').end();
    rest();
    expect(order()).toEqual([]);
    expect(analyser.get()).toMatchObject({ input: -1, output: 2, problem: 'Tf is 0 or more.' });
    analyser.ask(4);
    await under('live').end();
    expect(analyser.get()).toMatchObject({ output: 8, problem: null });
  });

  it('tells those who listen, and nothing after it was stopped', async () => {
    const { analyser, order, under, rest } = bench();
    let told = 0;
    const leave = analyser.subscribe(() => (told += 1));
    analyser.ask(1);
    await under('live').end();
    leave();
    analyser.ask(2);
    const late = under('live');
    analyser.ask(3);
    analyser.stop();
    await late.end();
    rest();
    expect(told).toBe(1);
    expect(order()).toEqual([]);
    expect(analyser.get()).toMatchObject({ input: 1 });
  });
});

describe('an answer in two parts', () => {
  const parts = { steps: ['outline', 'live'] as const };

  it('is asked for side by side: the curves do not wait for the responses', async () => {
    const { analyser, order, under } = bench(parts);
    for (const input of [1, 2, 3]) {
      analyser.ask(input);
      await under('outline').end();
    }
    expect(analyser.get()).toMatchObject({ input: 3, output: 6, complete: null, detail: 'outline' });
    expect(order()).toEqual([[1, 'live']]);
    await under('live').end();
    expect(analyser.get()).toMatchObject({ input: 3, output: 6, complete: 2, detail: 'outline' });
    await under('live').end();
    expect(analyser.get()).toMatchObject({ input: 3, output: 6, complete: 6, detail: 'outline' });
  });

  it('shows no curves of responses that came first', async () => {
    const { analyser, under } = bench(parts);
    analyser.ask(1);
    await under('live').end();
    expect(analyser.get()).toMatchObject({ output: null, complete: 2 });
    await under('outline').end();
    expect(analyser.get()).toMatchObject({ output: 2, complete: 2 });
  });

  it('keeps the newest full answer while a gain moves', async () => {
    const { analyser, under, rest } = bench(parts);
    analyser.ask(1);
    await under('outline').end();
    await under('live').end();
    rest();
    await under('full').end();
    analyser.ask(5);
    await under('outline').end();
    expect(analyser.get()).toMatchObject({ output: 10, complete: 2, rested: 2, detail: 'outline' });
  });
});
