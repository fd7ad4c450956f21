import { Activity, page, PageQuery } from '@/contract';
import { listActivity } from '@/db/stores/activity-store';
import { inProject } from '../http/paths';
import { route } from '../http/route';

export const activityRoutes = [
  route({
    method: 'get',
    path: '/api/projects/:projectId/activity',
    summary: 'Who did what when, newest first',
    tag: 'Projects',
    access: { project: 'read' },
    input: { params: inProject, query: PageQuery },
    output: page(Activity),
    handler: ({ context, project, query }) => listActivity(context.db, project.id, query),
  }),
];
