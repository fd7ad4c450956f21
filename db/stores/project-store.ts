import { and, asc, desc, eq, inArray } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { PageQuery, Project } from '@/contract';
import type { Database } from '../open';
import { analysis, design, project, projectMember, team, user } from '../tables';
import { transact } from '../transact';
import { recordActivity } from './activity-store';
import { before, rowsFor, toPage, type Page } from './keyset';
import { addMember } from './member-store';
import type { ActivityEntry, Stamp } from './stamp';

/** A project as one of its members sees it, with the version that its ETag tells. */
export interface SeenProject {
  readonly project: Project;
  readonly version: number;
}

interface Reader {
  readonly userId: string;
  readonly projectId: string;
}

const newest = alias(analysis, 'newest');

const columns = {
  id: project.id,
  name: project.name,
  vehicle: project.vehicle,
  description: project.description,
  archived: project.archived,
  operatingRange: project.operatingRange,
  version: project.version,
  role: projectMember.role,
  team: { id: team.id, name: team.name },
  createdAt: project.createdAt,
  updatedAt: project.updatedAt,
  analysis: { id: analysis.id, revision: analysis.designRevision, createdAt: analysis.createdAt, headline: analysis.headline },
  design: { id: design.id, name: design.name },
};

/** Projects that someone is a member of, each with its newest analysis where there is one. */
function projectsOf(db: Database) {
  const newestOfProject = db
    .select({ id: newest.id })
    .from(newest)
    .where(eq(newest.projectId, project.id))
    .orderBy(desc(newest.createdAt), desc(newest.id))
    .limit(1);
  return db
    .select(columns)
    .from(project)
    .innerJoin(projectMember, eq(projectMember.projectId, project.id))
    .innerJoin(team, eq(team.id, project.teamId))
    .leftJoin(analysis, eq(analysis.id, newestOfProject))
    .leftJoin(design, eq(design.id, analysis.designId));
}

type Row = ReturnType<ReturnType<typeof projectsOf>['all']>[number];
type Person = Project['people'][number];

function peopleOf(db: Database, projectIds: string[]): Map<string, Person[]> {
  const rows = db
    .select({ projectId: projectMember.projectId, id: user.id, name: user.name, role: projectMember.role })
    .from(projectMember)
    .innerJoin(user, eq(user.id, projectMember.userId))
    .where(inArray(projectMember.projectId, projectIds))
    .orderBy(asc(projectMember.createdAt), asc(user.name))
    .all();
  return rows.reduce(
    (people, { projectId, ...person }) => people.set(projectId, [...(people.get(projectId) ?? []), person]),
    new Map<string, Person[]>(),
  );
}

function toProject({ analysis: kept, design: analysed, version: _version, ...row }: Row, people: Person[]): Project {
  return {
    ...row,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
    headline: kept && kept.headline,
    latestAnalysis: kept &&
      analysed && { id: kept.id, design: { ...analysed, revision: kept.revision }, createdAt: kept.createdAt.toISOString() },
    people,
  };
}

/** The projects that someone may see, or those of them put away, the one that something happened to last first. */
export function listProjects(db: Database, { userId, archived }: { userId: string; archived: boolean }, page: PageQuery): Page<Project> {
  const rows = projectsOf(db)
    .where(and(eq(projectMember.userId, userId), eq(project.archived, archived), before(project.updatedAt, project.id, page)))
    .orderBy(desc(project.updatedAt), desc(project.id))
    .limit(rowsFor(page))
    .all();
  const people = peopleOf(
    db,
    rows.map(({ id }) => id),
  );
  return toPage(rows, page, { keyOf: (row) => [row.updatedAt, row.id], item: (row) => toProject(row, people.get(row.id) ?? []) });
}

export function findProject(db: Database, { userId, projectId }: Reader): SeenProject | undefined {
  const row = projectsOf(db)
    .where(and(eq(projectMember.userId, userId), eq(project.id, projectId)))
    .get();
  return row && { project: toProject(row, peopleOf(db, [projectId]).get(projectId) ?? []), version: row.version };
}

interface NewProject {
  readonly id: string;
  readonly teamId: string;
  readonly name: string;
  readonly vehicle: string;
  readonly description: string;
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

/** Writes a project with its maker as the owner. */
export function createProject(db: Database, { activity, stamp, ...created }: NewProject): void {
  transact(db, (within) => {
    within
      .insert(project)
      .values({ ...created, createdAt: stamp.at, updatedAt: stamp.at })
      .run();
    addMember(within, { projectId: created.id, userId: stamp.by, role: 'owner' }, stamp.at);
    recordActivity(within, created.id, activity, stamp);
  });
}

interface ProjectChange {
  readonly projectId: string;
  readonly version: number;
  readonly changes: Partial<Pick<Project, 'name' | 'vehicle' | 'description' | 'archived' | 'operatingRange'>>;
  readonly activity: ActivityEntry;
  readonly stamp: Stamp;
}

/** Changes a project that still has the version its editor saw; false, and nothing written, where it has not. */
export function updateProject(db: Database, { projectId, version, changes, activity, stamp }: ProjectChange): boolean {
  return transact(db, (within) => {
    const written = within
      .update(project)
      .set({ ...changes, version: version + 1 })
      .where(and(eq(project.id, projectId), eq(project.version, version)))
      .run();
    if (written.changes === 0) return false;
    recordActivity(within, projectId, activity, stamp);
    return true;
  });
}

/** Deletes a project with everything in it; false where its version is not the one its owner saw. */
export function deleteProject(db: Database, { projectId, version }: { projectId: string; version: number }): boolean {
  return (
    db
      .delete(project)
      .where(and(eq(project.id, projectId), eq(project.version, version)))
      .run().changes > 0
  );
}
