import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Activity, Member, Project } from '@/contract';
import { projectMember, rateLimit } from '@/db/tables';
import { made } from '../../support/a-project';
import type { Client } from '../../support/client';
import { addTo, idOf, invite, membersAt, verified } from '../../support/members';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let bo: Client;
let cy: Client;
let at: string;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
  bo = await verified(app, 'bo');
  cy = await verified(app, 'cy');
});
beforeEach(async () => {
  app.db.delete(rateLimit).run();
  at = `/api/projects/${(await made<Project>(ada, '/api/projects', { name: 'Speed hold' })).id}`;
});
afterAll(() => app.close());

const any = { 'if-match': '*' };
const giveRole = (by: Client, userId: string, role: string, headers: Record<string, string> = any) =>
  by.call<Member>('PATCH', `${at}/members/${userId}`, { role }, headers);
const takeOut = (by: Client, userId: string, headers: Record<string, string> = any) =>
  by.call('DELETE', `${at}/members/${userId}`, undefined, headers);

describe('members', () => {
  it('are listed with their roles, the oldest first, page by page', async () => {
    await addTo(ada, at, bo, 'reviewer');
    await addTo(ada, at, cy, 'viewer');
    expect(await membersAt(cy, at)).toMatchObject([
      { name: 'ada', role: 'owner' },
      { name: 'bo', role: 'reviewer' },
      { name: 'cy', role: 'viewer' },
    ]);
    const first = await ada.call<{ items: Member[]; nextCursor: string }>('GET', `${at}/members?limit=2`);
    const rest = await ada.call<{ items: Member[] }>('GET', `${at}/members?limit=2&cursor=${first.body.nextCursor}`);
    expect([...first.body.items, ...rest.body.items].map(({ name }) => name)).toEqual(['ada', 'bo', 'cy']);
  });

  it('show their addresses to owners and to themselves alone', async () => {
    await addTo(ada, at, bo, 'editor');
    const addresses = async (reader: Client) => (await membersAt(reader, at)).map(({ email }) => email);
    expect(await addresses(ada)).toEqual([ada.email, bo.email]);
    expect(await addresses(bo)).toEqual([null, bo.email]);
    const other = await bo.call<Member>('GET', `${at}/members/${await idOf(ada)}`);
    expect(other.body.email).toBeNull();
  });

  it('get another role that counts from the next request on', async () => {
    const userId = await addTo(ada, at, bo, 'viewer');
    const rename = () => bo.call('PATCH', at, { name: 'Speed hold, wet' }, any);
    expect((await rename()).status).toBe(403);
    expect((await giveRole(ada, userId, 'editor')).body).toMatchObject({ userId, role: 'editor' });
    expect((await rename()).status).toBe(200);
    await giveRole(ada, userId, 'reviewer');
    expect((await rename()).status).toBe(403);
  });

  it('are gone with the next request, and stay signed in', async () => {
    const userId = await addTo(ada, at, bo, 'editor');
    expect((await takeOut(ada, userId)).status).toBe(204);
    expect((await bo.call('GET', at)).status).toBe(404);
    expect((await bo.call('GET', '/api/projects?limit=200')).text).not.toContain(at.split('/').at(-1));
    expect((await bo.call('GET', '/api/me')).status).toBe(200);
  });

  it('leave by themselves', async () => {
    const userId = await addTo(ada, at, bo, 'viewer');
    expect((await takeOut(bo, userId)).status).toBe(204);
    expect((await bo.call('GET', at)).status).toBe(404);
    expect(await membersAt(ada, at)).toHaveLength(1);
  });

  it('take nobody else out unless they own the project', async () => {
    await addTo(ada, at, bo, 'editor');
    const userId = await addTo(ada, at, cy, 'viewer');
    expect((await takeOut(bo, userId)).status).toBe(403);
    expect((await giveRole(bo, await idOf(bo), 'owner')).status).toBe(403);
  });

  it('are changed only by who saw their latest role', async () => {
    const userId = await addTo(ada, at, bo, 'viewer');
    const { headers, body } = await ada.call<Member>('GET', `${at}/members/${userId}`);
    const etag = headers.get('etag')!;
    expect(body.etag).toBe(etag);
    expect((await giveRole(ada, userId, 'editor', {})).status).toBe(428);
    expect((await giveRole(ada, userId, 'editor', { 'if-match': etag })).headers.get('etag')).not.toBe(etag);
    expect((await giveRole(ada, userId, 'reviewer', { 'if-match': etag })).status).toBe(412);
    expect((await takeOut(ada, userId, { 'if-match': etag })).status).toBe(412);
    expect((await ada.call<Member>('GET', `${at}/members/${userId}`)).body.role).toBe('editor');
  });

  it('have one of four roles and nothing else', async () => {
    const userId = await addTo(ada, at, bo, 'viewer');
    expect((await giveRole(ada, userId, 'admin')).status).toBe(422);
    expect((await ada.call('PATCH', `${at}/members/${userId}`, { role: 'editor', ownerId: userId }, any)).status).toBe(400);
    expect((await giveRole(ada, userId, 'viewer')).body.role).toBe('viewer');
  });

  it('leave a history of invitations, roles and farewells without addresses', async () => {
    const userId = await addTo(ada, at, bo, 'viewer');
    await giveRole(ada, userId, 'editor');
    await takeOut(bo, userId);
    await addTo(ada, at, bo, 'viewer');
    await takeOut(ada, userId);
    await invite(ada, at, { email: 'nobody-yet@team.example' }, 'viewer');
    const { body, text } = await ada.call<{ items: Activity[] }>('GET', `${at}/activity`);
    const actions = ['member.invited', 'member.removed', 'member.added', 'member.left', 'member.roleChanged', 'member.added'];
    expect(body.items.map(({ action }) => action)).toEqual([...actions, 'project.created']);
    expect(text).not.toContain('@');
  });
});

describe('the last owner', () => {
  it('stays an owner and stays in', async () => {
    const userId = await idOf(ada);
    await addTo(ada, at, bo, 'editor');
    for (const reply of [await giveRole(ada, userId, 'editor'), await takeOut(ada, userId)])
      expect(reply).toMatchObject({ status: 409, body: { detail: expect.stringContaining('last owner') } });
    expect((await membersAt(ada, at))[0].role).toBe('owner');
  });

  it('goes once there is another', async () => {
    await addTo(ada, at, bo, 'owner');
    expect((await takeOut(ada, await idOf(ada))).status).toBe(204);
    expect((await ada.call('GET', at)).status).toBe(404);
    expect((await membersAt(bo, at)).map(({ name, role }) => [name, role])).toEqual([['bo', 'owner']]);
  });

  it.each([
    ['leave', (who: Client, own: string) => takeOut(who, own)],
    ['step down', (who: Client, own: string) => giveRole(who, own, 'viewer')],
    ['take each other out', (who: Client, _own: string, other: string) => takeOut(who, other)],
    ['demote each other', (who: Client, _own: string, other: string) => giveRole(who, other, 'viewer')],
  ])('is left when two owners %s at once', async (_what, act) => {
    for (let round = 0; round < 5; round += 1) {
      at = `/api/projects/${(await made<Project>(ada, '/api/projects', { name: `Round ${round}` })).id}`;
      const [a, b] = [await idOf(ada), await addTo(ada, at, bo, 'owner')];
      const statuses = (await Promise.all([act(ada, a, b), act(bo, b, a)])).map(({ status }) => status);
      // Whoever comes second is the last owner, or is no owner any more.
      expect(statuses.filter((status) => status < 300)).toHaveLength(1);
      const seats = app.db
        .select()
        .from(projectMember)
        .where(eq(projectMember.projectId, at.split('/').at(-1)!))
        .all();
      expect(seats.filter(({ role }) => role === 'owner')).toHaveLength(1);
    }
  });
});
