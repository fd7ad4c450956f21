import compression from 'compression';
import express, { type Express } from 'express';
import type { Context } from './context';
import { mount } from './http/mount';
import { refuseOtherOrigins } from './http/origin';
import { NotFound } from './http/problem';
import { problemHandler } from './http/problem-handler';
import { logRequests } from './http/request-log';
import { securityHeaders } from './http/security-headers';
import type { Route } from './http/route';
import { routes as allRoutes } from './routes';
import { serveClient } from './serve-client';
import { serveApiPage } from './system/api-page';

const BODY_LIMIT = '1mb';

/** The whole product behind one request handler; never listens. */
export function createApp(context: Context, routes: readonly Route[] = allRoutes): Express {
  const { config, log } = context;
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('query parser', 'simple');
  // A proxy on this machine may name the caller; nobody else may.
  app.set('trust proxy', 'loopback');
  app.use(logRequests(log), securityHeaders(config), compression());
  app.use('/api', refuseOtherOrigins(config.baseUrl), express.json({ limit: BODY_LIMIT, strict: false }), (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  mount(app, context, routes);
  serveApiPage(app, routes);
  app.use('/api', () => {
    throw new NotFound('There is no such address in this API.');
  });
  serveClient(app, config.clientDir);
  app.use(() => {
    throw new NotFound('There is nothing at this address.');
  });
  app.use(problemHandler(log));
  return app;
}
