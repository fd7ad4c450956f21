import { z } from 'zod';
import { Id, Job } from '@/contract';
import type { Context } from '../context';
import { EventStream } from '../http/event-stream';
import { NotFound } from '../http/problem';
import { route } from '../http/route';
import type { Posted } from './job-board';

const tag = 'Jobs';
const path = '/api/jobs/:jobId';
const params = z.object({ jobId: Id });

/** A job is its starter's alone. @throws NotFound */
function ownJob({ board }: Context, user: { readonly id: string }, jobId: string): Posted {
  const found = board.find(user.id, jobId);
  if (!found) throw new NotFound('There is no such computation: it is over, or the server has been started anew. Ask again.');
  return found;
}

const follow = (posted: Posted) =>
  new EventStream<Job>((tell, end) => {
    const tellOn = (job: Job) => {
      tell(job);
      if (job.state !== 'running') end();
    };
    const stop = posted.follow(tellOn);
    tellOn(posted.now());
    return stop;
  });

export const jobRoutes = [
  route({
    method: 'get',
    path,
    summary: 'How far a computation of one’s own is, and what came of it',
    tag,
    access: 'session',
    input: { params },
    output: Job,
    handler: ({ context, user, params: { jobId } }) => ownJob(context, user, jobId).now(),
  }),
  route({
    method: 'get',
    path: `${path}/events`,
    summary: 'The same as Server-Sent Events: the job as it is, then after every change, until it is over',
    tag,
    access: 'session',
    input: { params },
    output: Job,
    events: true,
    handler: ({ context, user, params: { jobId } }) => follow(ownJob(context, user, jobId)),
  }),
  route({
    method: 'delete',
    path,
    summary: 'Stops a computation of one’s own; nothing of it is kept',
    tag,
    access: 'session',
    input: { params },
    output: Job,
    handler: ({ context, user, params: { jobId } }) => {
      const posted = ownJob(context, user, jobId);
      posted.cancel();
      return posted.now();
    },
  }),
];
