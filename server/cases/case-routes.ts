import { Case, Cases, CreateCase, CreateGrid, Id, page, PageQuery, UpdateCase } from '@/contract';
import { listCases } from '@/db/stores/case-store';
import { stampNow } from '../activity/stamp-now';
import { answer } from '../http/answer';
import { inProject } from '../http/paths';
import { route } from '../http/route';
import { addCase, changeCase, openCase, removeCase, seenCase } from './case-service';
import { addGrid } from './grid-service';

const tag = 'Cases';
const ofProject = '/api/projects/:projectId/cases';
const ofCase = `${ofProject}/:caseId`;
const caseParams = inProject.extend({ caseId: Id });
const withTag = (seen: Case) => answer(seen, { etag: seen.etag });

export const caseRoutes = [
  route({
    method: 'get',
    path: ofProject,
    summary: 'The conditions that the loop must survive, in their order',
    tag,
    access: { project: 'read' },
    input: { params: inProject, query: PageQuery },
    output: page(Case),
    handler: ({ context, project, query }) => {
      const { items, nextCursor } = listCases(context.db, project.id, query);
      return { items: items.map(seenCase), nextCursor };
    },
  }),
  route({
    method: 'post',
    path: ofProject,
    summary: 'Adds a case on a plant of the project',
    tag,
    access: { project: 'edit' },
    input: { params: inProject, body: CreateCase },
    output: Case,
    status: 201,
    handler: async ({ context, project, user, body }) => withTag(await addCase(context, project.id, body, stampNow(user))),
  }),
  route({
    method: 'post',
    path: `${ofProject}/grid`,
    summary: 'Adds a case for every combination of lists, all of them or none',
    tag,
    access: { project: 'edit' },
    input: { params: inProject, body: CreateGrid },
    output: Cases,
    status: 201,
    handler: async ({ context, project, user, body }) => ({ items: await addGrid(context, project.id, body, stampNow(user)) }),
  }),
  route({
    method: 'get',
    path: ofCase,
    summary: 'One case',
    tag,
    access: { project: 'read' },
    input: { params: caseParams },
    output: Case,
    handler: ({ context, params }) => withTag(seenCase(openCase(context, params))),
  }),
  route({
    method: 'patch',
    path: ofCase,
    summary: 'Changes a case; what was analysed before keeps it as it was',
    tag,
    access: { project: 'edit' },
    input: { params: caseParams, body: UpdateCase },
    output: Case,
    handler: async ({ context, params, user, body, expectVersion }) => {
      const before = openCase(context, params);
      expectVersion(before.version);
      return withTag(await changeCase(context, before, { key: params, changes: body, stamp: stampNow(user) }));
    },
  }),
  route({
    method: 'delete',
    path: ofCase,
    summary: 'Takes a case away, unless it is the last',
    tag,
    access: { project: 'edit' },
    input: { params: caseParams },
    output: null,
    handler: ({ context, params, user, expectVersion }) => {
      const before = openCase(context, params);
      expectVersion(before.version);
      removeCase(context, params, before, stampNow(user));
    },
  }),
];
