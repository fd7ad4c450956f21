import { availableParallelism } from 'node:os';
import { Piscina } from 'piscina';
import type { FoundRoom, RoomQuestion, WayName } from '@/analysis/project';
import type { Analysis, Loop, PlantModel, PlantReading } from '@/contract';
import { LoopRefused, TooBusy } from './refusals';
import type { Outcome } from './task';
import { watchdog } from './watchdog';
import { workerEntry, type WorkerEntry } from './worker-entry';

export interface LoopPoolOptions {
  readonly threads: number;
  /** How long the engine may take over one loop, ms. */
  readonly timeoutMs: number;
  /** How many loops may wait; past that, the caller is told to come back. */
  readonly maxWaiting: number;
  /** What one thread may hold, MB. */
  readonly memoryMb: number;
  readonly entry: WorkerEntry;
  /** Hears of a thread that ended outside any task; another takes its place. */
  readonly onError: (error: Error) => void;
}

/** The engine on worker threads: the server's main thread never runs it. */
export interface LoopPool {
  /** How many loops are computed at the same time. */
  readonly threads: number;
  /** @throws LoopRefused with the engine's pointer, or `#` when it took too long; TooBusy */
  analyse(loop: Loop, options: { curves: boolean }): Promise<Analysis>;
  /** Several loops on one thread, without curves. @throws as analyse; `index` of the LoopRefused says which loop it was */
  analyseAll(loops: readonly Loop[], options: { responses: boolean }): Promise<Analysis[]>;
  /** @throws as analyse */
  room(way: WayName, question: RoomQuestion, reach: number): Promise<FoundRoom>;
  /** @throws as analyse */
  describe(plant: PlantModel): Promise<PlantReading>;
  close(): Promise<void>;
}

const defaults = (): LoopPoolOptions => ({
  threads: Math.min(availableParallelism(), 8),
  timeoutMs: 2_000,
  maxWaiting: 2_000,
  memoryMb: 512,
  entry: workerEntry(),
  onError: () => undefined,
});

const stopped = (detail: string, index: number) => new LoopRefused({ pointer: '#', detail }, index);
const isOutOfMemory = (error: unknown) => error instanceof Error && 'code' in error && error.code === 'ERR_WORKER_OUT_OF_MEMORY';

function valueOf<Value>(outcome: Outcome<Value>, index = 0): Value {
  if ('refused' in outcome) throw new LoopRefused(outcome.refused, index);
  return outcome.value;
}

/** A thread cannot be interrupted: one that takes too long is ended, and piscina starts another in its place. */
export function createLoopPool(options: Partial<LoopPoolOptions> = {}): LoopPool {
  const { threads, timeoutMs, maxWaiting, memoryMb, entry, onError } = { ...defaults(), ...options };
  const pool = new Piscina({
    ...entry,
    minThreads: 1,
    maxThreads: threads,
    idleTimeout: 60_000,
    maxQueue: maxWaiting,
    resourceLimits: { maxOldGenerationSizeMb: memoryMb },
  });
  pool.on('error', onError);

  async function run<Value>(name: string, task: object): Promise<Value> {
    if (pool.queueSize >= maxWaiting) throw new TooBusy();
    const { started, signal, begun, release } = watchdog(timeoutMs);
    try {
      return valueOf<Value>(await pool.run({ ...task, started }, { name, signal, transferList: [started] }));
    } catch (error) {
      if (signal.aborted) throw stopped(`This loop took longer than ${timeoutMs / 1000} s to analyse and was stopped.`, begun());
      if (isOutOfMemory(error)) throw stopped('This loop needs more memory than one analysis may take.', begun());
      throw error;
    } finally {
      release();
    }
  }

  return {
    threads,
    analyse: (loop, { curves }) => run<Analysis>('analyse', { loop, curves }),
    analyseAll: async (loops, { responses }) => {
      const outcomes = await run<Outcome<Analysis>[]>('analyseAll', { loops, responses });
      return outcomes.map(valueOf);
    },
    room: (way, question, reach) => run<FoundRoom>('room', { way, question, reach }),
    describe: (plant) => run<PlantReading>('describe', { plant }),
    close: () => pool.close({ force: true }),
  };
}
