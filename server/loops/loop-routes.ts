import { z } from 'zod';
import { Analysis, Loop } from '@/contract';
import { route } from '../http/route';
import { countAnalysis } from './count-analysis';

export const loopRoutes = [
  route({
    method: 'post',
    path: '/api/loops/analyse',
    summary: 'Analyses one loop and keeps nothing; ?curves=false leaves the curves out',
    tag: 'Loops',
    access: 'session',
    input: { body: Loop, query: z.strictObject({ curves: z.enum(['true', 'false']).default('true') }) },
    output: Analysis,
    idempotent: false,
    handler: ({ context, user, body, query }) => {
      countAnalysis(context, user);
      return context.jobs.analyse(body, { curves: query.curves === 'true' });
    },
  }),
];
