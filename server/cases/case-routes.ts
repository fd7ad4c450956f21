import { Case, page, PageQuery } from '@/contract';
import { listCases } from '@/db/stores/case-store';
import { inProject } from '../http/paths';
import { route } from '../http/route';

export const caseRoutes = [
  route({
    method: 'get',
    path: '/api/projects/:projectId/cases',
    summary: 'The conditions that the loop must survive',
    tag: 'Cases',
    access: { project: 'read' },
    input: { params: inProject, query: PageQuery },
    output: page(Case),
    handler: ({ context, project, query }) => listCases(context.db, project.id, query),
  }),
];
