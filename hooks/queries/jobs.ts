import type { Job, ProblemDetails } from '@/contract';
import { ApiProblem } from '../api/problem';
import { request } from '../api/request';

const ASK_AGAIN_MS = 500;

const pause = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));

const stopped: ProblemDetails = { type: 'about:blank', title: 'Stopped', status: 409, detail: 'The computation was stopped.' };

/**
 * Waits for a long computation to end.
 *
 * @throws ApiProblem with what the computation failed of, NoSignal where nobody answers
 */
export async function resultOf(job: Job): Promise<NonNullable<Job['result']>> {
  let now = job;
  while (now.state === 'running') {
    await pause(ASK_AGAIN_MS);
    now = await request<Job>('GET', `/jobs/${job.id}`);
  }
  if (now.result === null) throw new ApiProblem(now.problem ?? stopped);
  return now.result;
}
