import { CreateDesign, DesignRevision, Id, page, PageQuery, RevisedDesign, ReviseDesign } from '@/contract';
import { listDesignRevisions, listDesigns } from '@/db/stores/design-store';
import { stampNow } from '../activity/stamp-now';
import { inProject, revisionNumber } from '../http/paths';
import { route } from '../http/route';
import { addDesignRevision, enterDesign, openDesign } from './design-service';

const tag = 'Designs';
const ofDesign = inProject.extend({ designId: Id });

export const designRoutes = [
  route({
    method: 'get',
    path: '/api/projects/:projectId/designs',
    summary: 'The designs of a project as they are now',
    tag,
    access: { project: 'read' },
    input: { params: inProject, query: PageQuery },
    output: page(DesignRevision),
    handler: ({ context, project, query }) => listDesigns(context.db, project.id, query),
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/designs',
    summary: 'Enters a design with its first revision',
    tag,
    access: { project: 'edit' },
    input: { params: inProject, body: CreateDesign },
    output: DesignRevision,
    status: 201,
    handler: ({ context, project, user, body }) => enterDesign(context, project.id, body, stampNow(user)),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/designs/:designId',
    summary: 'A design’s latest revision',
    tag,
    access: { project: 'read' },
    input: { params: ofDesign },
    output: DesignRevision,
    handler: ({ context, params }) => openDesign(context, params),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/designs/:designId/revisions',
    summary: 'All revisions of a design, newest first',
    tag,
    access: { project: 'read' },
    input: { params: ofDesign, query: PageQuery },
    output: page(DesignRevision),
    handler: ({ context, params, query }) => {
      openDesign(context, params);
      return listDesignRevisions(context.db, params, query);
    },
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/designs/:designId/revisions',
    summary: 'Adds a revision on top of the latest; with analyse, its analysis is kept together with it',
    tag,
    access: { project: 'edit' },
    input: { params: ofDesign, body: ReviseDesign },
    output: RevisedDesign,
    status: 201,
    handler: ({ context, params, user, body }) => addDesignRevision(context, params, body, stampNow(user)),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/designs/:designId/revisions/:revision',
    summary: 'One revision of a design; it never changes',
    tag,
    access: { project: 'read' },
    input: { params: ofDesign.extend({ revision: revisionNumber }) },
    output: DesignRevision,
    handler: ({ context, params: { revision, ...key } }) => openDesign(context, key, revision),
  }),
];
