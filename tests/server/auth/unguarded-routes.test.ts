import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { plant } from '@/db/tables';
import { inProject } from '@/server/http/paths';
import { route, type Route } from '@/server/http/route';
import { routes } from '@/server/routes';
import { startTestApp } from '../../support/test-app';
import { rows } from './walk/rows';
import { openToReaders, serve, withoutCheck, type Sabotaged } from './walk/sabotage';
import { turnsAway } from './walk/walk';
import { makeWorld, type World } from './walk/world';

const app = await startTestApp({ env: { ANALYSE_PER_MINUTE: '100000' } });
afterAll(() => app.close());

let world: World;
beforeAll(async () => {
  world = await makeWorld(app);
});

describe('the authorisation test finds a route', () => {
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
