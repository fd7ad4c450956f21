import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Logger } from 'pino';

/** Gives every request an id and logs what became of it. Queries and bodies stay out: tokens travel in them. */
export const logRequests =
  (log: Logger): RequestHandler =>
  (request, response, next) => {
    const requestId = randomUUID();
    const began = performance.now();
    const { method, path } = request;
    response.locals.requestId = requestId;
    response.set('X-Request-Id', requestId);
    response.on('close', () => {
      const level = response.statusCode >= 500 ? 'error' : 'info';
      log[level]({ requestId, method, path, status: response.statusCode, ms: Math.round(performance.now() - began) }, 'request');
    });
    next();
  };
