import { caseLoop } from '@/analysis/project';
import type { Analysis, DesignContent, FrozenCase } from '@/contract';
import { Meaningless } from '../http/problem';
import { inTurn, type Watch } from '../jobs/in-turn';
import type { LoopPool } from '../jobs/loop-pool';
import { LoopRefused } from '../jobs/refusals';

/** Loops that cross to a thread together: enough to make the passage cheap, few enough to share the threads evenly. */
const MOST_TOGETHER = 16;
/** One batch waits behind each that runs, so that no thread stands idle in between. */
const BATCHES_PER_THREAD = 2;

/** What the engine points at is not in the body of a request that names cases, so the case's name stands for it. */
const inCase = (name: string, error: unknown) =>
  error instanceof LoopRefused ? new Meaningless([{ pointer: '#', detail: `In the case “${name}”: ${error.error.detail}` }]) : error;

/** One frozen case with its curves. @throws Meaningless where the engine refuses it */
export async function computeCase(jobs: LoopPool, design: DesignContent, frozen: FrozenCase): Promise<Analysis> {
  try {
    return await jobs.analyse(caseLoop(frozen, design), { curves: true });
  } catch (error) {
    throw inCase(frozen.name, error);
  }
}

function inBatches<Item>(items: readonly Item[], threads: number): Item[][] {
  const size = Math.min(MOST_TOGETHER, Math.ceil(items.length / threads));
  return Array.from({ length: Math.ceil(items.length / size) }, (_, k) => items.slice(k * size, (k + 1) * size));
}

interface Wanted extends Watch {
  /** false: no time responses. */
  readonly responses: boolean;
}

/** The numbers of every case, without curves, in the order of the cases. @throws Meaningless naming the case that the engine refuses */
export async function computeNumbers(
  jobs: LoopPool,
  design: DesignContent,
  cases: readonly FrozenCase[],
  { responses, ...watch }: Wanted,
): Promise<Analysis[]> {
  const batch = async (some: readonly FrozenCase[]) => {
    try {
      const numbers = await jobs.analyseAll(
        some.map((frozen) => caseLoop(frozen, design)),
        { responses },
      );
      watch.done?.(some.length);
      return numbers;
    } catch (error) {
      throw error instanceof LoopRefused ? inCase(some[error.index].name, error) : error;
    }
  };
  const batches = await inTurn(inBatches(cases, jobs.threads), batch, { ...watch, atOnce: jobs.threads * BATCHES_PER_THREAD });
  return batches.flat();
}
