import { z } from 'zod';
import { Analysis, AnalysisSummary, CreateAnalysis, Id, JobAnswer, KeptAnalysis, page, PageQuery, Recomputed } from '@/contract';
import { listAnalyses } from '@/db/stores/analysis-store';
import { stampNow } from '../activity/stamp-now';
import { answer } from '../http/answer';
import { inProject } from '../http/paths';
import { route } from '../http/route';
import { countAnalysis } from '../loops/count-analysis';
import { caseCurves, openAnalysis, recompute } from './analysis-service';
import { startAnalysis } from './keep-analysis';

const tag = 'Analyses';
const ofAnalysis = inProject.extend({ analysisId: Id });

export const analysisRoutes = [
  route({
    method: 'get',
    path: '/api/projects/:projectId/analyses',
    summary: 'Kept analyses without inputs and results, newest first',
    tag,
    access: { project: 'read' },
    input: { params: inProject, query: PageQuery },
    output: page(AnalysisSummary),
    handler: ({ context, project, query }) => listAnalyses(context.db, project.id, query),
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/analyses',
    summary:
      'Analyses a design revision over the project’s cases and keeps the result, frozen; 202 with a job where that takes longer than 2 s',
    tag,
    access: { project: 'edit' },
    input: { params: inProject, body: CreateAnalysis },
    output: z.union([KeptAnalysis, JobAnswer]),
    status: 201,
    handler: async ({ context, project, user, body }) => {
      countAnalysis(context, user);
      const started = await startAnalysis(context, { projectId: project.id, choice: body, stamp: stampNow(user) });
      return 'job' in started ? answer(started, { status: 202 }) : started;
    },
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/analyses/:analysisId',
    summary: 'A kept analysis with its inputs and the numbers of every case',
    tag,
    access: { project: 'read' },
    input: { params: ofAnalysis },
    output: KeptAnalysis,
    handler: ({ context, params }) => openAnalysis(context, params),
  }),
  route({
    method: 'get',
    path: '/api/projects/:projectId/analyses/:analysisId/cases/:caseId',
    summary: 'One case with its curves, computed again from the frozen inputs',
    tag,
    access: { project: 'read' },
    input: { params: ofAnalysis.extend({ caseId: Id }) },
    output: Analysis,
    handler: ({ context, user, params: { caseId, ...key } }) => {
      countAnalysis(context, user);
      return caseCurves(context, key, caseId);
    },
  }),
  route({
    method: 'post',
    path: '/api/projects/:projectId/analyses/:analysisId/recompute',
    summary: 'Computes the frozen inputs once more and says what came out otherwise; keeps nothing',
    tag,
    access: { project: 'read' },
    input: { params: ofAnalysis },
    output: Recomputed,
    idempotent: false,
    handler: ({ context, user, params }) => {
      countAnalysis(context, user);
      return recompute(context, params);
    },
  }),
];
