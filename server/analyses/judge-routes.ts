import { Conditions, Judge, Judged } from '@/contract';
import { inProject } from '../http/paths';
import { route } from '../http/route';
import { countAnalysis } from '../loops/count-analysis';
import { freezeConditions } from './freeze-conditions';
import { judgeDesign } from './judge-service';

const tag = 'Analyses';

export const judgeRoutes = [
  route({
    method: 'get',
    path: '/api/projects/:projectId/conditions',
    summary: 'What every design is judged against now: cases with their plants ready to run, limits, operating range',
    tag,
    access: { project: 'read' },
    input: { params: inProject },
    output: Conditions,
    handler: ({ context, project }) => freezeConditions(context, project.id),
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/judge',
    summary: 'Judges a design over the project’s cases as they stand now; keeps nothing',
    tag,
    access: { project: 'read' },
    input: { params: inProject, body: Judge },
    output: Judged,
    idempotent: false,
    handler: ({ context, project, user, body }) => {
      countAnalysis(context, user);
      return judgeDesign(context, project.id, body);
    },
  }),
];
