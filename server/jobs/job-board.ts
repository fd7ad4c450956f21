import { randomUUID } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import type { Job } from '@/contract';
import { Problem, TooMany } from '../http/problem';
import type { Watch } from './in-turn';

/** Jobs live in memory: a restart ends them, and who asked is told by a 404 to ask again. */

const KEPT_MS = 3_600_000;
const MOST_RUNNING = 4;
const RETRY_SECONDS = 10;

type Result = NonNullable<Job['result']>;

interface Order {
  /** The only one who may see it. */
  readonly owner: string;
  readonly kind: Job['kind'];
  /** In cases, as `done` counts them. */
  readonly total: number;
  readonly work: (watch: Required<Watch>) => Promise<Result>;
}

export interface Posted {
  readonly now: () => Job;
  /** The result where it is there in this time, ms; null where it is not. @throws what the work threw in this time */
  readonly within: (ms: number) => Promise<Result | null>;
  /** Tells of every change from now on; the last is not `running`. Answers how to stop. */
  readonly follow: (tell: (job: Job) => void) => () => void;
  readonly cancel: () => void;
}

export interface JobBoard {
  /** @throws TooMany where the owner has too many that run */
  readonly post: (order: Order) => Posted;
  readonly find: (owner: string, jobId: string) => Posted | undefined;
}

/** Nobody who waits for an answer keeps the server from ending. */
const later = (ms: number) => pause(ms, null, { ref: false });

function post({ kind, total, work }: Order, onError: (error: unknown) => void): Posted {
  const abort = new AbortController();
  const listeners = new Set<(job: Job) => void>();
  const createdAt = new Date().toISOString();
  let job: Job = { id: randomUUID(), kind, state: 'running', progress: { done: 0, total }, result: null, problem: null, createdAt };
  const change = (changes: Partial<Job>) => {
    if (job.state !== 'running') return;
    job = { ...job, ...changes };
    for (const tell of listeners) tell(job);
  };
  const outcome = work({ signal: abort.signal, done: (cases) => change({ progress: { done: job.progress.done + cases, total } }) });
  outcome.then(
    (result) => change({ state: 'done', result, progress: { done: total, total } }),
    (error: unknown) => {
      if (!(error instanceof Problem) && !abort.signal.aborted) onError(error);
      const problem = error instanceof Problem ? error : new Problem(500, 'Something went wrong on our side. It has been logged.');
      change({ state: 'failed', problem: problem.details });
    },
  );
  return {
    now: () => job,
    within: (ms) => Promise.race([outcome, later(ms)]),
    follow: (tell) => {
      listeners.add(tell);
      return () => listeners.delete(tell);
    },
    cancel: () => {
      abort.abort();
      change({ state: 'cancelled' });
    },
  };
}

/** @param onError hears what nobody foresaw */
export function createJobBoard(onError: (error: unknown) => void): JobBoard {
  const board = new Map<string, { readonly owner: string; readonly posted: Posted }>();
  const isOver = ({ state, createdAt }: Job) => state !== 'running' && Date.parse(createdAt) < Date.now() - KEPT_MS;
  return {
    post: (order) => {
      for (const [id, { posted }] of board) if (isOver(posted.now())) board.delete(id);
      const running = [...board.values()].filter(({ owner, posted }) => owner === order.owner && posted.now().state === 'running');
      if (running.length >= MOST_RUNNING) throw new TooMany(`${MOST_RUNNING} of your computations are still running.`, RETRY_SECONDS);
      const posted = post(order, onError);
      board.set(posted.now().id, { owner: order.owner, posted });
      return posted;
    },
    find: (owner, jobId) => {
      const found = board.get(jobId);
      return found?.owner === owner ? found.posted : undefined;
    },
  };
}
