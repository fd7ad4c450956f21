import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { allows, type Me, type Role } from '@/contract';
import { project, projectMember } from '@/db/tables';

import type { Route } from '@/server/http/route';
import { routes } from '@/server/routes';
import { startTestApp, type TestApp } from '../../support/test-app';

const roles: readonly Role[] = ['owner', 'editor', 'reviewer', 'viewer'];
const projectId = randomUUID();

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
  await app.client('stranger').signUp();
  for (const role of roles) {
    const { body: me } = await (await app.client(role).signUp()).call<Me>('GET', '/api/me');
    const now = new Date();
    if (role === 'owner')
      app.db
        .insert(project)
        .values({ id: projectId, teamId: me.teams[0].id, name: 'Wet-track speed', createdAt: now, updatedAt: now })
        .run();
    app.db.insert(projectMember).values({ projectId, userId: me.id, role, createdAt: now }).run();
  }
});
afterAll(() => app.close());

/** A call without a body: whoever may call the route is told so, or told that nothing is there. */
async function knock(who: string, { method, path }: Route): Promise<number> {
  const address = path.replace(':projectId', projectId).replace(/:\w+/g, () => randomUUID());
  return (await app.client(who).call(method.toUpperCase(), address)).status;
}

const named = (wanted: (route: Route) => boolean) =>
  routes.filter(wanted).map((route) => [`${route.method.toUpperCase()} ${route.path}`, route] as const);
const inside = named(({ access }) => typeof access === 'object');

describe('who is not signed in', () => {
  it.each(named(({ access }) => access !== 'public'))('is told to sign in: %s', async (_name, route) => {
    expect(await knock('nobody', route)).toBe(401);
  });
});

describe('who has no role in a project', () => {
  it.each(inside)('hears that it is not there: %s', async (_name, route) => {
    expect(await knock('stranger', route)).toBe(404);
  });
});

describe.each(roles)('as %s', (role) => {
  it.each(inside)('%s answers as the table of permissions says', async (_name, route) => {
    if (typeof route.access !== 'object') throw new Error('not inside a project');
    const status = await knock(role, route);
    if (allows(role, route.access.project)) expect([401, 403]).not.toContain(status);
    else expect(status).toBe(403);
  });
});

describe('routes inside a project', () => {
  it('are never open to everyone who is signed in', () => {
    const loose = routes.filter(({ path, access }) => path.includes(':projectId') && typeof access !== 'object');
    expect(loose).toEqual([]);
  });
});
