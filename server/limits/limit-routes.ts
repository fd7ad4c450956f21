import { Limits, PutLimits } from '@/contract';
import { readLimits, type KeptLimits } from '@/db/stores/limits-store';
import { stampNow } from '../activity/stamp-now';
import { answer } from '../http/answer';
import { etagOf } from '../http/etag';
import { inProject } from '../http/paths';
import { route } from '../http/route';
import { replaceLimits } from './limit-service';

const path = '/api/projects/:projectId/limits';
const tag = 'Limits';
const withTag = ({ limits, version }: KeptLimits) => answer(limits, { etag: etagOf(version) });

export const limitRoutes = [
  route({
    method: 'get',
    path,
    summary: 'What the project demands; an empty list has an ETag too',
    tag,
    access: { project: 'read' },
    input: { params: inProject },
    output: Limits,
    handler: ({ context, project }) => withTag(readLimits(context.db, project.id)),
  }),
  route({
    method: 'put',
    path,
    summary: 'Replaces all limits; what was analysed before keeps its own',
    tag,
    access: { project: 'edit' },
    input: { params: inProject, body: PutLimits },
    output: Limits,
    handler: ({ context, project, user, body, expectVersion }) => {
      const { version } = readLimits(context.db, project.id);
      expectVersion(version);
      return withTag(replaceLimits(context.db, { projectId: project.id, version, items: body.items }, stampNow(user)));
    },
  }),
];
