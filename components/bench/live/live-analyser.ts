import type { Detail } from '../engine/engine-tasks';
import { createLane } from './lane';

/** Where the engine's answer stands: of what it was computed, how finely, and why the newest has none. */
export interface LiveAnswer<Input, Output> {
  /** The newest input that was computed; null before the first. */
  readonly input: Input | null;
  /** The newest answer. It belongs to an older input while `problem` is set. */
  readonly output: Output | null;
  /** The newest answer that is more than an outline; the coarse one where there is one in full too. */
  readonly complete: Output | null;
  /** The newest answer in full. */
  readonly rested: Output | null;
  readonly detail: Detail;
  /** Why the newest input has no answer; null where it has. */
  readonly problem: string | null;
}

interface LiveAnalyserOptions<Input, Output> {
  compute(input: Input, detail: Detail): Promise<Output>;
  /** What is computed while a gain moves, side by side; one coarse answer where absent. */
  steps?: () => readonly Detail[];
  /** Words for an error of the engine; others are thrown on. */
  explain(error: unknown): string;
  /** Does a task after a rest. Gives back what cancels it. */
  rest(task: () => void): () => void;
}

export interface LiveAnalyser<Input, Output> {
  /** The newest input wins: what was asked for and not begun is forgotten, never queued. */
  ask(input: Input): void;
  get(): LiveAnswer<Input, Output>;
  subscribe(listener: () => void): () => void;
  stop(): void;
}

/** An input with its place in the row of those that were asked. */
interface Question<Input> {
  readonly input: Input;
  readonly place: number;
  readonly parts: readonly Detail[];
}

/**
 * Computes the newest input coarsely, perhaps in two parts, and once more in full when no newer one came for a while. What was begun is
 * ended before a newer input is taken up: moves at the screen's rate never starve a slower part.
 * An input that cannot be computed leaves the previous answer standing, with the problem beside it.
 */
export function createLiveAnalyser<Input, Output>(options: LiveAnalyserOptions<Input, Output>): LiveAnalyser<Input, Output> {
  const { compute, explain, rest, steps = () => ['live'] } = options;
  const listeners = new Set<() => void>();
  let answer: LiveAnswer<Input, Output> = { input: null, output: null, complete: null, rested: null, detail: 'live', problem: null };
  let asked: Question<Input> | null = null;
  let count = 0;
  let cancelRest: (() => void) | null = null;
  /** Places of what `output` and `complete` belong to. */
  const reached = { output: 0, complete: 0 };

  const publish = (change: Partial<LiveAnswer<Input, Output>>) => {
    answer = { ...answer, ...change };
    for (const listener of listeners) listener();
  };
  const take = ({ input, place, parts }: Question<Input>, detail: Detail, output: Output) => {
    // A full answer to what has moved on meanwhile is none to rest on.
    if (place < reached.output && detail !== 'live') return;
    const complete = detail !== 'outline' && place > reached.complete ? { complete: output } : {};
    if (detail !== 'outline') reached.complete = Math.max(reached.complete, place);
    // Of an answer in two parts the curves are in the outline.
    if (place < reached.output || (detail === 'live' && parts.includes('outline'))) return publish(complete);
    reached.output = place;
    publish({ input, output, detail, problem: null, ...complete, ...(detail === 'full' && { rested: output }) });
  };
  const answerTo = (detail: Detail) => async (question: Question<Input>) => {
    try {
      const output = await compute(question.input, detail);
      if (asked !== null) take(question, detail, output);
    } catch (error) {
      const problem = explain(error);
      if (asked === null || question.place < reached.output) return;
      reached.output = question.place;
      publish({ input: question.input, problem });
    }
  };
  const lanes = { outline: createLane(answerTo('outline')), live: createLane(answerTo('live')), full: createLane(answerTo('full')) };

  return {
    ask(input) {
      if (input === asked?.input) return;
      const question = { input, place: (count += 1), parts: steps() };
      asked = question;
      cancelRest?.();
      for (const detail of question.parts) lanes[detail].push(question);
      cancelRest = rest(() => {
        cancelRest = null;
        const refused = answer.problem !== null && reached.output === question.place;
        if (!refused) lanes.full.push(question);
      });
    },
    get: () => answer,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    stop() {
      cancelRest?.();
      for (const lane of Object.values(lanes)) lane.clear();
      cancelRest = asked = null;
    },
  };
}
