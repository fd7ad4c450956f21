import type { Case, DesignContent, FrozenCase, FrozenInputs } from '@/contract';
import type { Database } from '@/db/open';
import { allCases } from '@/db/stores/case-store';
import { findPlant } from '@/db/stores/plant-store';
import { Conflict, NotFound } from '../http/problem';

/** A design revision by name and content, kept or about to be. */
export interface DesignToFreeze extends DesignContent {
  readonly id: string;
  readonly name: string;
  readonly revision: number;
}

function chosenCases(db: Database, projectId: string, caseIds: readonly string[] | undefined): Case[] {
  const cases = allCases(db, projectId);
  if (cases.length === 0) throw new Conflict('This project has no case yet: enter a plant first.');
  if (caseIds === undefined) return cases;
  if (!caseIds.every((id) => cases.some((known) => known.id === id))) throw new NotFound('One of these cases is not in this project.');
  return cases.filter(({ id }) => caseIds.includes(id));
}

function freezeCase(db: Database, projectId: string, { plantId, plantRevision, ...kept }: Case): FrozenCase {
  const found = findPlant(db, { projectId, plantId }, plantRevision);
  if (!found) throw new NotFound(`The plant revision of the case “${kept.name}” is not there.`);
  const { note: _note, createdAt: _createdAt, createdBy: _createdBy, ...plant } = found;
  return { ...kept, plant };
}

/**
 * Everything an analysis depends on, in full, so that later edits cannot change it.
 *
 * @param caseIds all cases of the project where absent
 * @throws Conflict in a project without a case, NotFound for a case that is not in it
 */
export function freezeInputs(db: Database, projectId: string, design: DesignToFreeze, caseIds?: readonly string[]): FrozenInputs {
  const { id, name, revision, controller, sampling, actuator } = design;
  const cases = chosenCases(db, projectId, caseIds).map((chosen) => freezeCase(db, projectId, chosen));
  return { design: { id, name, revision, controller, sampling, actuator }, cases, limits: [] };
}
