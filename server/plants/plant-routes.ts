import { CreatePlant, Id, page, PageQuery, PlantReading, PlantRevision, ReadPlant, RevisePlant } from '@/contract';
import { listPlantRevisions, listPlants } from '@/db/stores/plant-store';
import { stampNow } from '../activity/stamp-now';
import { inProject, revisionNumber } from '../http/paths';
import { route } from '../http/route';
import { addPlantRevision, enterPlant, openPlant } from './plant-service';

const tag = 'Plants';
const ofPlant = inProject.extend({ plantId: Id });

export const plantRoutes = [
  route({
    method: 'post',
    path: '/api/plants/read',
    summary: 'Works a plant out once: gain, zeros, poles, coefficients, and in words',
    tag,
    access: 'session',
    input: { body: ReadPlant },
    output: PlantReading,
    idempotent: false,
    handler: ({ context, body }) => context.jobs.describe(body.plant),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/plants',
    summary: 'The plants of a project as they are now',
    tag,
    access: { project: 'read' },
    input: { params: inProject, query: PageQuery },
    output: page(PlantRevision),
    handler: ({ context, project, query }) => listPlants(context.db, project.id, query),
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/plants',
    summary: 'Enters a plant; the first one brings the case “nominal”',
    tag,
    access: { project: 'edit' },
    input: { params: inProject, body: CreatePlant },
    output: PlantRevision,
    status: 201,
    handler: ({ context, project, user, body }) => enterPlant(context, project.id, body, stampNow(user)),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/plants/:plantId',
    summary: 'A plant’s latest revision',
    tag,
    access: { project: 'read' },
    input: { params: ofPlant },
    output: PlantRevision,
    handler: ({ context, params }) => openPlant(context, params),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/plants/:plantId/revisions',
    summary: 'All revisions of a plant, newest first',
    tag,
    access: { project: 'read' },
    input: { params: ofPlant, query: PageQuery },
    output: page(PlantRevision),
    handler: ({ context, params, query }) => {
      openPlant(context, params);
      return listPlantRevisions(context.db, params, query);
    },
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/plants/:plantId/revisions',
    summary: 'Adds a revision on top of the latest',
    tag,
    access: { project: 'edit' },
    input: { params: ofPlant, body: RevisePlant },
    output: PlantRevision,
    status: 201,
    handler: ({ context, params, user, body }) => addPlantRevision(context, params, body, stampNow(user)),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/plants/:plantId/revisions/:revision',
    summary: 'One revision of a plant; it never changes',
    tag,
    access: { project: 'read' },
    input: { params: ofPlant.extend({ revision: revisionNumber }) },
    output: PlantRevision,
    handler: ({ context, params: { revision, ...key } }) => openPlant(context, key, revision),
  }),
];
