import type { DesignContent, FrozenInputs } from '@/contract';
import type { Context } from '../context';
import { Conflict } from '../http/problem';
import { freezeConditions } from './freeze-conditions';

/** A design revision by name and content, kept or about to be. */
export interface DesignToFreeze extends DesignContent {
  readonly id: string;
  readonly name: string;
  readonly revision: number;
}

/**
 * Everything an analysis depends on, in full, so that later edits cannot change it.
 *
 * @param caseIds all cases of the project where absent
 * @throws as freezeConditions, and Conflict in a project without a case
 */
export async function freezeInputs(
  parts: Pick<Context, 'db' | 'jobs'>,
  projectId: string,
  { id, name, revision, controller, sampling, actuator }: DesignToFreeze,
  caseIds?: readonly string[],
): Promise<FrozenInputs> {
  const conditions = await freezeConditions(parts, projectId, caseIds);
  if (conditions.cases.length === 0) throw new Conflict('This project has no case yet: enter a plant first.');
  return { design: { id, name, revision, controller, sampling, actuator }, ...conditions };
}
