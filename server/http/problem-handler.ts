import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import { Malformed, Problem } from './problem';

const isHttpError = (error: unknown): error is Error & { status: number; type: string } =>
  error instanceof Error && 'status' in error && 'type' in error && typeof error.status === 'number' && typeof error.type === 'string';

/** What Express and its body parser throw, said as everything else is said. */
function fromExpress(error: Error & { status: number; type: string }): Problem {
  if (error.type === 'entity.parse.failed') return new Malformed([{ pointer: '#', detail: 'The body is not JSON.' }]);
  if (error.type === 'entity.too.large') return new Problem(413, 'The body is larger than 1 MB.');
  return new Problem(error.status, 'The request could not be read.');
}

function toProblem(error: unknown): Problem | null {
  if (error instanceof Problem) return error;
  if (isHttpError(error) && error.status < 500) return fromExpress(error);
  if (error instanceof URIError) return new Problem(400, 'The address cannot be decoded.');
  return null;
}

export function sendProblem(response: Response, problem: Problem): void {
  response.status(problem.status).set(problem.headers).type('application/problem+json').send(JSON.stringify(problem.details));
}

/** The one place where an error becomes an answer. What nobody foresaw is logged in full and told in one sentence. */
export const problemHandler =
  (log: Logger): ErrorRequestHandler =>
  (error, request, response, next) => {
    const problem = toProblem(error);
    if (!problem) log.error({ err: error, requestId: response.locals.requestId, path: request.path }, 'unforeseen error');
    if (response.headersSent) return next(error);
    sendProblem(response, problem ?? new Problem(500, 'Something went wrong on our side. It has been logged.'));
  };
