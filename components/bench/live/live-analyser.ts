/** Where the engine's answer stands: of what it was computed, how finely, and why the newest has none. */
export interface LiveAnswer<Input, Output> {
  /** The newest input that was computed; null before the first. */
  readonly input: Input | null;
  /** The newest answer. It belongs to an older input while `problem` is set. */
  readonly output: Output | null;
  /** The newest answer that is more than an outline. */
  readonly complete: Output | null;
  /** The newest answer in full. */
  readonly rested: Output | null;
  readonly detail: Detail;
  /** Why the newest input has no answer; null where it has. */
  readonly problem: string | null;
}

/** outline: coarse, and what is slow to compute left out; live: coarse; full: what is kept. */
export type Detail = 'outline' | 'live' | 'full';

/** When to compute. Each takes a task and gives back what cancels it. */
export interface Schedule {
  frame(task: () => void): () => void;
  rest(task: () => void): () => void;
}

interface LiveAnalyserOptions<Input, Output> {
  /** `outline` is the outline of the same input where there is one. */
  compute(input: Input, detail: Detail, outline: Output | null): Output;
  /** What is computed while a gain moves, a frame each; one coarse answer where absent. */
  steps?: () => readonly Detail[];
  /** Words for an error of the engine; others are thrown on. */
  explain(error: unknown): string;
  schedule: Schedule;
}

export interface LiveAnalyser<Input, Output> {
  /** The newest input wins: what was asked for and not begun is forgotten, never queued. */
  ask(input: Input): void;
  get(): LiveAnswer<Input, Output>;
  subscribe(listener: () => void): () => void;
  stop(): void;
}

/**
 * Computes the newest input once a frame, coarsely, perhaps in two steps, and once more in full when no newer one came for a while.
 * What was begun is ended before a newer input is: moves at the screen's rate never starve the second step.
 * An input that cannot be computed leaves the previous answer standing, with the problem beside it.
 */
export function createLiveAnalyser<Input, Output>(options: LiveAnalyserOptions<Input, Output>): LiveAnalyser<Input, Output> {
  const { compute, explain, schedule, steps = () => ['live'] } = options;
  const listeners = new Set<() => void>();
  let answer: LiveAnswer<Input, Output> = { input: null, output: null, complete: null, rested: null, detail: 'live', problem: null };
  let asked: Input | null = null;
  let begun: { readonly input: Input; readonly next: readonly Detail[] } | null = null;
  let cancelFrame: (() => void) | null = null;
  let cancelRest: (() => void) | null = null;

  const answerWith = (input: Input, detail: Detail) => {
    const outline = answer.input === input && answer.detail === 'outline' ? answer.output : null;
    try {
      const output = compute(input, detail, outline);
      const complete = detail === 'outline' ? answer.complete : output;
      const rested = detail === 'full' ? output : answer.rested;
      answer = { input, output, complete, rested, detail, problem: null };
    } catch (error) {
      answer = { ...answer, input, problem: explain(error) };
    }
    for (const listener of listeners) listener();
  };
  const restOn = (input: Input) => {
    cancelRest?.();
    cancelRest = schedule.rest(() => {
      cancelRest = null;
      if (input === asked && answer.problem === null) answerWith(input, 'full');
    });
  };
  const onFrame = () => {
    cancelFrame = null;
    if (asked === null) return;
    const { input, next } = begun ?? { input: asked, next: steps() };
    answerWith(input, next[0]);
    begun = next.length > 1 && answer.problem === null ? { input, next: next.slice(1) } : null;
    if (begun !== null || input !== asked) cancelFrame ??= schedule.frame(onFrame);
    else restOn(input);
  };

  return {
    ask(input) {
      if (input === asked) return;
      asked = input;
      cancelRest?.();
      cancelRest = null;
      cancelFrame ??= schedule.frame(onFrame);
    },
    get: () => answer,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    stop() {
      cancelFrame?.();
      cancelRest?.();
      cancelFrame = cancelRest = begun = asked = null;
    },
  };
}
