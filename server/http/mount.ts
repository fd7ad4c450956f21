import type { Express, Request, Response } from 'express';
import { authorise } from '../auth/authorise';
import { identify } from '../auth/identify';
import type { Context } from '../context';
import { Answer } from './answer';
import { checkAnswer } from './check-answer';
import { expectVersion } from './etag';
import { EventStream, sendEvents } from './event-stream';
import { answerOnce } from './idempotency';
import { Problem } from './problem';
import type { AnyVisit, Route } from './route';
import { validate, validateParams } from './validate';

/** Who is asking, whether they may, and only then what they ask: a stranger learns nothing from validation. */
async function receive(context: Context, route: Route, request: Request): Promise<AnyVisit> {
  const { access, input } = route;
  const { user, setCookies } = await identify(context, request);
  if (setCookies.length > 0) request.res?.append('Set-Cookie', setCookies);
  const project = authorise(context.db, access, user, request.params.projectId);
  return {
    context,
    params: input.params && validateParams(input.params, request.params),
    query: input.query && validate(input.query, request.query),
    body: input.body && validate(input.body, request.body),
    user,
    project,
    expectVersion: (version) => expectVersion(request.get('if-match'), version),
    request,
  };
}

function send({ config }: Context, route: Route, response: Response, reply: unknown): void {
  if (reply instanceof EventStream) return sendEvents(response, reply);
  const { body, options } = reply instanceof Answer ? reply : new Answer(reply);
  if (config.checkAnswers && route.output) checkAnswer(route.output, body);
  response.status(options.status ?? route.status).set(options.headers ?? {});
  if (options.etag) response.set('ETag', options.etag);
  if (route.output === null) response.end();
  else response.json(body);
}

/** Puts declared routes into the app. A path that is known answers other methods with 405. */
export function mount(app: Express, context: Context, routes: readonly Route[]): void {
  for (const route of routes) {
    app[route.method](route.path, async (request, response) => {
      const visit = await receive(context, route, request);
      const reply = route.idempotent ? await answerOnce(visit, route) : await route.handler(visit);
      send(context, route, response, reply);
    });
  }
  for (const path of new Set(routes.map((route) => route.path))) {
    const here = routes.filter((route) => route.path === path);
    const allow = here.map(({ method }) => method.toUpperCase()).join(', ');
    app.all(path, () => {
      throw new Problem(405, `Only ${allow} can be asked of this address.`, { headers: { Allow: allow } });
    });
  }
}
