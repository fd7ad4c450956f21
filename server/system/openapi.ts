import { STATUS_CODES } from 'node:http';
import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from 'zod-openapi';
import { permissions, ProblemDetails } from '@/contract';
import type { Route } from '../http/route';

const problem = (description: string) => ({ description, content: { 'application/problem+json': { schema: ProblemDetails } } });

/** Which refusals a route can answer, from how it is declared. */
function refusals({ access, input }: Route): Record<string, ReturnType<typeof problem>> {
  const statuses = [
    ...(input.body || input.query ? [400, 422] : []),
    ...(access === 'public' ? [] : [401]),
    ...(typeof access === 'object' ? [403, 404] : []),
  ];
  return Object.fromEntries(statuses.map((status) => [status, problem(STATUS_CODES[status] ?? '')]));
}

const listed = (roles: readonly string[]) => roles.map((role) => `${role}s`).join(', ');

function operation(route: Route): ZodOpenApiOperationObject {
  const { summary, tag, input, output, status, access, method, path, events } = route;
  const success = output && status < 300 ? { content: { [events ? 'text/event-stream' : 'application/json']: { schema: output } } } : {};
  return {
    operationId: `${method}${path.replace(/[^A-Za-z]+(\w)/g, (_, letter: string) => letter.toUpperCase())}`,
    summary,
    ...(typeof access === 'object' && { description: `For ${listed(permissions[access.project].roles)}.` }),
    tags: [tag],
    security: access === 'public' ? [] : [{ session: [] }],
    requestParams: { ...(input.params && { path: input.params }), ...(input.query && { query: input.query }) },
    ...(input.body && { requestBody: { required: true, content: { 'application/json': { schema: input.body } } } }),
    responses: { [status]: { description: STATUS_CODES[status] ?? '', ...success }, ...refusals(route), default: problem('Refused') },
  };
}

/** The OpenAPI 3.1 document of all routes, from the very schemas that validate them. */
export function openApiDocument(routes: readonly Route[]) {
  const paths: Record<string, Record<string, ZodOpenApiOperationObject>> = {};
  for (const route of routes) {
    const path = route.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operation(route) };
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Kerbline',
      version: '1.0.0',
      description:
        'Frequencies in rad/s, times in s, angles in degrees where a field is named so, gains plain factors. Refusals are problem+json (RFC 9457). ' +
        'A request that changes something needs an Origin of this site; a POST may carry an Idempotency-Key.',
    },
    components: { securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'kerbline.session_token' } } },
    paths: paths as ZodOpenApiPathsObject,
  });
}
