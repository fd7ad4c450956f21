/** Where the engine's answer stands: of what it was computed, how finely, and why the newest has none. */
export interface LiveAnswer<Input, Output> {
  /** The newest input that was computed; null before the first. */
  readonly input: Input | null;
  /** The newest answer. It belongs to an older input while `problem` is set. */
  readonly output: Output | null;
  readonly detail: Detail;
  /** Why the newest input has no answer; null where it has. */
  readonly problem: string | null;
}

export type Detail = 'live' | 'full';

/** When to compute. Each takes a task and gives back what cancels it. */
export interface Schedule {
  frame(task: () => void): () => void;
  rest(task: () => void): () => void;
}

interface LiveAnalyserOptions<Input, Output> {
  compute(input: Input, detail: Detail): Output;
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
 * Computes the newest input once a frame, coarsely, and once more in full when no newer one came for a while.
 * An input that cannot be computed leaves the previous answer standing, with the problem beside it.
 */
export function createLiveAnalyser<Input, Output>(options: LiveAnalyserOptions<Input, Output>): LiveAnalyser<Input, Output> {
  const { compute, explain, schedule } = options;
  const listeners = new Set<() => void>();
  let answer: LiveAnswer<Input, Output> = { input: null, output: null, detail: 'live', problem: null };
  let asked: Input | null = null;
  let cancelFrame: (() => void) | null = null;
  let cancelRest: (() => void) | null = null;

  const answerWith = (input: Input, detail: Detail) => {
    try {
      answer = { input, output: compute(input, detail), detail, problem: null };
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
    answerWith(asked, 'live');
    restOn(asked);
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
      cancelFrame = cancelRest = null;
      asked = null;
    },
  };
}
