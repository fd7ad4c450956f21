import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import type { CreateProject, UpdateProject } from '@/contract';
import type { Database } from '@/db/open';
import { createProject, deleteProject, findProject, updateProject, type SeenProject } from '@/db/stores/project-store';
import type { Stamp } from '@/db/stores/stamp';
import { teamsOf } from '@/db/stores/team-store';
import { activityEntry } from '../activity/activity-entry';
import { changedMeanwhile } from '../http/etag';
import { Archived, Meaningless, NotAllowed, NotFound } from '../http/problem';

interface Place {
  readonly projectId: string;
  readonly userId: string;
}

/** @throws NotFound */
export function openProject(db: Database, place: Place): SeenProject {
  const seen = findProject(db, place);
  if (!seen) throw new NotFound();
  return seen;
}

/**
 * Makes a project in the caller's own team, or in another team of theirs.
 * @throws NotFound where the team is not one of theirs
 */
export function startProject(
  db: Database,
  { name, vehicle = '', description = '', teamId }: z.output<typeof CreateProject>,
  stamp: Stamp,
): SeenProject {
  const teams = teamsOf(db, stamp.by);
  const team = teamId === undefined ? teams.find(({ role }) => role === 'owner') : teams.find(({ id }) => id === teamId);
  if (!team) throw new NotFound('There is no such team.');
  const id = randomUUID();
  createProject(db, {
    id,
    teamId: team.id,
    name,
    vehicle,
    description,
    activity: activityEntry('project.created', `made the project ${name}`),
    stamp,
  });
  return openProject(db, { projectId: id, userId: stamp.by });
}

function changeEntry({ archived }: z.output<typeof UpdateProject>, name: string) {
  if (archived === true) return activityEntry('project.archived', `archived the project ${name}`);
  if (archived === false) return activityEntry('project.restored', `took the project ${name} out of the archive`);
  return activityEntry('project.changed', `changed what the project ${name} says of itself`);
}

/**
 * Changes what a project says of itself; of an archived one, only that it is archived.
 * @throws NotAllowed where someone else than an owner archives, Archived, Problem 412 where another change came first
 */
export function changeProject(
  db: Database,
  { project, version }: SeenProject,
  changes: z.output<typeof UpdateProject>,
  stamp: Stamp,
): SeenProject {
  if (changes.archived !== undefined && project.role !== 'owner')
    throw new NotAllowed('Only an owner archives a project or takes it back.');
  if (project.archived && changes.archived !== false) throw new Archived();
  const activity = changeEntry(changes, changes.name ?? project.name);
  if (!updateProject(db, { projectId: project.id, version, changes, activity, stamp })) throw changedMeanwhile();
  return openProject(db, { projectId: project.id, userId: stamp.by });
}

/**
 * Deletes a project with everything in it, once its name was repeated.
 * @throws Meaningless where the name is another, Problem 412 where another change came first
 */
export function removeProject(db: Database, { project, version }: SeenProject, confirmName: string): void {
  if (confirmName !== project.name)
    throw new Meaningless([
      { pointer: '/confirmName', detail: `Repeat the project’s name, ${project.name}, to delete it with everything in it.` },
    ]);
  if (!deleteProject(db, { projectId: project.id, version })) throw changedMeanwhile();
}
