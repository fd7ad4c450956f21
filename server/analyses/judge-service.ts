import type { z } from 'zod';
import { judgeCases, needsResponses } from '@/analysis/project';
import type { Judge, Judged } from '@/contract';
import type { Context } from '../context';
import { Conflict } from '../http/problem';
import { computeNumbers } from './compute-numbers';
import { computeRoom } from './compute-room';
import { freezeConditions } from './freeze-conditions';

/**
 * What a design would be worth over cases of the project as they stand now; nothing is kept.
 * @throws as freezeConditions and computeNumbers, Conflict in a project without a case
 */
export async function judgeDesign(
  parts: Pick<Context, 'db' | 'jobs'>,
  projectId: string,
  { caseIds, parts: wanted, room, ...design }: z.output<typeof Judge>,
): Promise<Judged> {
  const conditions = await freezeConditions(parts, projectId, caseIds);
  const { cases, limits } = conditions;
  if (cases.length === 0) throw new Conflict('This project has no case yet: enter a plant first.');
  const responses = wanted === 'all' || needsResponses(limits);
  const numbers = await computeNumbers(parts.jobs, design, cases, { responses });
  const { results, headline } = judgeCases(design, conditions, numbers);
  return {
    verdict: headline.verdict,
    headline,
    room: room ? await computeRoom(parts.jobs, { design, cases, limits, results }) : null,
    results,
  };
}
