import { z } from 'zod';
import { Id, Timestamp } from './common';
import { ProblemDetails } from './problem';

/** A computation that takes longer than an answer may. */
export const Job = z
  .object({
    id: Id,
    kind: z.enum(['analysis']),
    state: z.enum(['running', 'done', 'failed', 'cancelled']),
    progress: z
      .object({ done: z.int(), total: z.int() })
      .meta({ description: 'counted in cases: each is analysed, and asked how much room it leaves three ways' }),
    result: z.object({ projectId: Id, analysisId: Id }).nullable().meta({ description: 'once done' }),
    problem: ProblemDetails.nullable().meta({ description: 'why it failed' }),
    createdAt: Timestamp,
  })
  .meta({ id: 'Job' });
export type Job = z.infer<typeof Job>;

/** In place of the thing itself, with 202. */
export const JobAnswer = z.object({ job: Job }).meta({ id: 'JobAnswer' });
export type JobAnswer = z.infer<typeof JobAnswer>;
