import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { plant } from '@/db/tables';
import { createApp } from '@/server/app';
import { inProject } from '@/server/http/paths';
import { route, type Route } from '@/server/http/route';
import { routes } from '@/server/routes';
import { startTestApp } from '../../support/test-app';
import { rows } from './walk/rows';
import { documentAt, openToReaders, serve, withoutCheck, type Sabotaged } from './walk/sabotage';
import { letsIn, turnsAway } from './walk/walk';
import { makeWorld, type World } from './walk/world';

const app = await startTestApp({ env: { ANALYSE_PER_MINUTE: '100000' } });
const operations = await documentAt(app.url);
afterAll(() => app.close());

let world: World;
beforeAll(async () => {
  world = await makeWorld(app);
});

const names = operations.map(({ name }) => name);
const named = (name: string) => operations.find((operation) => operation.name === name)!;

describe('every route of the OpenAPI document', () => {
  it('has a row that says who may call it, and every row a route', () => {
    expect(Object.keys(rows).sort()).toEqual([...names].sort());
  });

  it('is every route there is, but for the description itself and the page', () => {
    const page = '/{*path}';
    const layers = createApp(app.context).router.stack.flatMap(({ route: known }) => (known ? [known.path] : []));
    const undescribed = [...new Set(layers)].filter(
      (path) => !operations.some((operation) => operation.path === path.replace(/:(\w+)/g, '{$1}')),
    );
    expect(undescribed.sort()).toEqual(['/api/docs', '/api/docs/open.js', '/api/openapi.json', page]);
  });

  it.each(names)('turns everyone else away without a hint, and changes nothing: %s', async (name) => {
    expect(await turnsAway(world, named(name), rows[name])).toEqual([]);
  });

  it.each(names)('lets in whom the table of permissions says: %s', async (name) => {
    expect(await letsIn(world, named(name), rows[name])).toEqual([]);
  });
});

describe('the walk finds a route', () => {
  const nameOf = ({ method, path }: Route) => `${method.toUpperCase()} ${path.replace(/:(\w+)/g, '{$1}')}`;
  const inside = routes.filter(({ access }) => typeof access === 'object');
  const findings = ({ world: there, operations: known }: Sabotaged, name: string) =>
    turnsAway(
      there,
      known.find((operation) => operation.name === name)!,
      rows[name],
    );
  const replacing = (other: Route) => routes.map((one) => (nameOf(one) === nameOf(other) ? other : one));
  const found = async (other: Route) => {
    const server = await serve(app, world, replacing(other));
    const lines = await findings(server, nameOf(other));
    server.close();
    return lines;
  };

  describe('whose check was removed', () => {
    let server: Sabotaged;
    beforeAll(async () => {
      server = await serve(app, world, routes.map(withoutCheck));
    });
    afterAll(() => server.close());

    // Its query asks for the reader's own projects, so that it stays closed.
    const closedTwice = ['GET /api/projects/{projectId}'];
    it.each(inside.map(nameOf).filter((name) => !closedTwice.includes(name)))('%s', async (name) => {
      expect(await findings(server, name)).toContainEqual(expect.stringMatching(/^(rival|editor|reviewer|viewer): \d+, wanted 40[34]/));
    });
  });

  describe('that asks for less than it needs', () => {
    let server: Sabotaged;
    beforeAll(async () => {
      server = await serve(app, world, routes.map(openToReaders));
    });
    afterAll(() => server.close());

    const needy = inside.filter((one) => typeof one.access === 'object' && one.access.project !== 'read');
    it.each(needy.map(nameOf))('%s', async (name) => {
      expect(await findings(server, name)).toContainEqual(expect.stringMatching(/^(editor|reviewer|viewer): \d+, wanted 403/));
    });
  });

  it('that nobody gave a row', async () => {
    const extra = route({
      method: 'get',
      path: '/api/projects/:projectId/secrets',
      summary: 'What nobody has thought of',
      tag: 'Test',
      access: 'session',
      input: { params: inProject },
      output: z.object({}),
      handler: () => ({}),
    });
    const server = await serve(app, world, [...routes, extra]);
    expect(server.operations.map(({ name }) => name).filter((name) => !rows[name])).toEqual([nameOf(extra)]);
    server.close();
  });

  it('that looks a thing up without its project', async () => {
    const careless = route({
      method: 'get',
      path: '/api/projects/:projectId/plants/:plantId',
      summary: 'A plant of whomever',
      tag: 'Test',
      access: { project: 'read' },
      input: { params: inProject.extend({ plantId: z.uuid() }) },
      output: z.object({ name: z.string() }),
      handler: ({ context, params }) => ({
        name: context.db.select().from(plant).where(eq(plant.id, params.plantId)).get()?.name ?? 'none',
      }),
    });
    expect(await found(careless)).toContainEqual(expect.stringMatching(/^someone else’s plantId: 200, wanted 404/));
  });

  it('that takes fields which nobody may set', async () => {
    const generous = route({
      method: 'patch',
      path: '/api/projects/:projectId',
      summary: 'Takes anything',
      tag: 'Test',
      access: { project: 'edit' },
      input: { params: inProject, body: z.looseObject({ description: z.string().optional() }) },
      output: z.object({}),
      handler: () => ({}),
    });
    const lines = await found(generous);
    for (const field of ['role', 'ownerId', 'createdAt', 'id'])
      expect(lines).toContainEqual(expect.stringMatching(new RegExp(`^with an extra ${field}: 200, wanted 400`)));
  });
});
