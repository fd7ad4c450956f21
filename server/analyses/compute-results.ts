import { caseLoop, judgeCase } from '@/analysis/project';
import type { Analysis, CaseResult, FrozenCase, FrozenInputs } from '@/contract';
import { Meaningless } from '../http/problem';
import type { LoopPool } from '../jobs/loop-pool';
import { LoopRefused } from '../jobs/refusals';

/** What the engine points at is not in the body of a request that names cases, so the case's name stands for it. */
const inCase = (name: string, error: unknown) =>
  error instanceof LoopRefused ? new Meaningless([{ pointer: '#', detail: `In the case “${name}”: ${error.error.detail}` }]) : error;

/** One frozen case, computed anew. @throws Meaningless where the engine refuses it */
export async function computeCase(
  jobs: LoopPool,
  { design }: FrozenInputs,
  frozen: FrozenCase,
  options: { curves: boolean },
): Promise<Analysis> {
  try {
    return await jobs.analyse(caseLoop(frozen, design), options);
  } catch (error) {
    throw inCase(frozen.name, error);
  }
}

/** Every frozen case, computed and judged, in the order of the cases. @throws as computeCase */
export function computeResults(jobs: LoopPool, inputs: FrozenInputs): Promise<CaseResult[]> {
  const { design, cases, limits } = inputs;
  return Promise.all(
    cases.map(async (frozen) => {
      const numbers = await computeCase(jobs, inputs, frozen, { curves: false });
      const stated = { sampling: design.sampling !== null, deadTime: frozen.plant.deadTimeBasis !== null };
      return { case: { id: frozen.id, name: frozen.name }, ...judgeCase(limits, numbers, stated), numbers };
    }),
  );
}
