import { z } from 'zod';
import { CreateProject, DeleteProject, page, PageQuery, Project, UpdateProject } from '@/contract';
import { listProjects, type SeenProject } from '@/db/stores/project-store';
import { stampNow } from '../activity/stamp-now';
import { answer } from '../http/answer';
import { etagOf } from '../http/etag';
import { inProject } from '../http/paths';
import { route } from '../http/route';
import { changeProject, openProject, removeProject, startProject } from './project-service';

const tag = 'Projects';
const ListQuery = PageQuery.extend({ archived: z.enum(['true', 'false']).default('false') });
const withTag = ({ project, version }: SeenProject) => answer(project, { etag: etagOf(version) });

export const projectRoutes = [
  route({
    method: 'get',
    path: '/api/projects',
    summary: 'The projects that the caller may see, the one worked on last first; those put away with ?archived=true',
    tag,
    access: 'session',
    input: { query: ListQuery },
    output: page(Project),
    handler: ({ context, user, query }) => listProjects(context.db, { userId: user.id, archived: query.archived === 'true' }, query),
  }),
  route({
    method: 'post',
    path: '/api/projects',
    summary: 'Makes a project; its maker owns it',
    tag,
    access: 'session',
    input: { body: CreateProject },
    output: Project,
    status: 201,
    handler: ({ context, user, body }) => withTag(startProject(context.db, body, stampNow(user))),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId',
    summary: 'One project with its headline and people',
    tag,
    access: { project: 'read' },
    input: { params: inProject },
    output: Project,
    handler: ({ context, user, project }) => withTag(openProject(context.db, { projectId: project.id, userId: user.id })),
  }),
  route({
    method: 'patch',
    path: '/api/projects/:projectId',
    summary: 'Renames, describes, archives a project',
    tag,
    access: { project: 'edit', whileArchived: true },
    input: { params: inProject, body: UpdateProject },
    output: Project,
    handler: ({ context, user, project, body, expectVersion }) => {
      const seen = openProject(context.db, { projectId: project.id, userId: user.id });
      expectVersion(seen.version);
      return withTag(changeProject(context.db, seen, body, stampNow(user)));
    },
  }),
  route({
    method: 'delete',
    path: '/api/projects/:projectId',
    summary: 'Deletes a project with everything in it, after its name is repeated',
    tag,
    access: { project: 'manage', whileArchived: true },
    input: { params: inProject, body: DeleteProject },
    output: null,
    handler: ({ context, user, project, body, expectVersion }) => {
      const seen = openProject(context.db, { projectId: project.id, userId: user.id });
      expectVersion(seen.version);
      removeProject(context.db, seen, body.confirmName);
    },
  }),
];
