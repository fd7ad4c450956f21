import { availableParallelism } from 'node:os';
import { Piscina } from 'piscina';
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
  readonly entry: WorkerEntry;
}

/** The engine on worker threads: the server's main thread never runs it. */
export interface LoopPool {
  /** @throws LoopRefused with the engine's pointer, or `#` when it took too long; TooBusy */
  analyse(loop: Loop, options: { curves: boolean }): Promise<Analysis>;
  /** @throws as analyse */
  describe(plant: PlantModel): Promise<PlantReading>;
  close(): Promise<void>;
}

const MEMORY_PER_THREAD_MB = 512;

/** A thread cannot be interrupted: one that takes too long is ended, and piscina starts another in its place. */
export function createLoopPool(options: Partial<LoopPoolOptions> = {}): LoopPool {
  const { threads = Math.min(availableParallelism(), 8), timeoutMs = 2_000, maxWaiting = 2_000, entry = workerEntry() } = options;
  const pool = new Piscina({
    ...entry,
    minThreads: 1,
    maxThreads: threads,
    idleTimeout: 60_000,
    maxQueue: maxWaiting,
    resourceLimits: { maxOldGenerationSizeMb: MEMORY_PER_THREAD_MB },
  });

  async function run<Value>(name: string, task: object): Promise<Value> {
    if (pool.queueSize >= maxWaiting) throw new TooBusy();
    const { started, signal, release } = watchdog(timeoutMs);
    try {
      const outcome: Outcome<Value> = await pool.run({ ...task, started }, { name, signal, transferList: [started] });
      if ('refused' in outcome) throw new LoopRefused(outcome.refused);
      return outcome.value;
    } catch (error) {
      if (signal.aborted)
        throw new LoopRefused({ pointer: '#', detail: `This loop took longer than ${timeoutMs / 1000} s to analyse and was stopped.` });
      throw error;
    } finally {
      release();
    }
  }

  return {
    analyse: (loop, { curves }) => run<Analysis>('analyse', { loop, curves }),
    describe: (plant) => run<PlantReading>('describe', { plant }),
    close: () => pool.close({ force: true }),
  };
}
