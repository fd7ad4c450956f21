import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import { Malformed, NotFound, Problem } from './problem';

/** What Express, its body parser and its file server throw. */
interface HttpError extends Error {
  readonly status: number;
  readonly type?: string;
}

const isHttpError = (error: unknown): error is HttpError => error instanceof Error && 'status' in error && typeof error.status === 'number';

function fromExpress({ status, type }: HttpError): Problem {
  if (type === 'entity.parse.failed') return new Malformed([{ pointer: '#', detail: 'The body is not JSON.' }]);
  if (type === 'entity.too.large') return new Problem(413, 'The body is larger than 1 MB.');
  return status === 404 ? new NotFound() : new Problem(status, 'The request could not be read.');
}

function toProblem(error: unknown): Problem | null {
  if (error instanceof Problem) return error;
  return isHttpError(error) && error.status < 500 ? fromExpress(error) : null;
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
