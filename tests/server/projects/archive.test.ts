import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Activity, Project } from '@/contract';
import { aDesign, aPlant, makeProject, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { addTo, invite, invitationsAt, verified } from '../../support/members';
import { startTestApp, type TestApp } from '../../support/test-app';

const any = { 'if-match': '*' };
let app: TestApp;
let ada: Client;
let bo: Client;
let made: MadeProject;
let boId: string;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
  bo = await verified(app, 'bo');
  made = await makeProject(ada);
  boId = await addTo(ada, made.at, bo, 'editor');
  await invite(ada, made.at, { email: 'guest@team.example' }, 'viewer');
  await ada.call('PATCH', made.at, { archived: true }, any);
});
afterAll(() => app.close());

describe('an archived project', () => {
  it('refuses every change with a sentence that says why', async () => {
    const { at, plant, design } = made;
    const changes: [string, string, unknown?][] = [
      ['PATCH', '', { name: 'Other' }],
      ['PATCH', '', { archived: true }],
      ['POST', '/plants', aPlant],
      ['POST', `/plants/${plant.id}/revisions`, { plant: aPlant.plant, baseRevision: 1 }],
      ['POST', '/designs', aDesign],
      ['POST', '/analyses', { designId: design.id }],
      ['POST', '/members', { email: 'x@team.example', role: 'viewer' }],
      ['PATCH', `/members/${boId}`, { role: 'viewer' }],
      ['POST', `/invitations/${(await invitationsAt(ada, at))[0].id}/resend`],
    ];
    for (const [method, path, body] of changes) {
      const reply = await ada.call(method, `${at}${path}`, body, any);
      expect([path, reply.status, reply.body.detail]).toEqual([path, 409, expect.stringContaining('archived')]);
    }
    expect((await bo.call('POST', `${at}/plants`, aPlant)).status).toBe(409);
  });

  it('tells whoever may not change it that they may not', async () => {
    expect((await bo.call('PATCH', made.at, { archived: false }, any)).status).toBe(403);
    expect((await bo.call('POST', `${made.at}/members`, { email: 'x@team.example', role: 'viewer' })).status).toBe(403);
  });

  it('is read as before', async () => {
    for (const path of ['', '/plants', '/designs', '/cases', '/analyses', '/members', '/activity'])
      expect((await bo.call('GET', `${made.at}${path}`)).status).toBe(200);
  });

  it('still lets access end, comes back by an owner, and remembers both', async () => {
    const [{ id }] = await invitationsAt(ada, made.at);
    expect((await ada.call('DELETE', `${made.at}/invitations/${id}`)).status).toBe(204);
    expect((await bo.call('DELETE', `${made.at}/members/${boId}`, undefined, any)).status).toBe(204);
    expect(await ada.call<Project>('PATCH', made.at, { archived: false }, any)).toMatchObject({ status: 200, body: { archived: false } });
    expect((await ada.call('POST', `${made.at}/designs`, aDesign)).status).toBe(201);
    const { body } = await ada.call<{ items: Activity[] }>('GET', `${made.at}/activity`);
    const actions = body.items.map(({ action }) => action);
    expect(actions).toEqual(expect.arrayContaining(['project.archived', 'project.restored', 'member.left', 'invitation.takenBack']));
  });

  it('is deleted by an owner who repeats its name', async () => {
    const { at, project } = await makeProject(ada, 'Old loop');
    await ada.call('PATCH', at, { archived: true }, any);
    expect((await ada.call('DELETE', at, { confirmName: project.name }, any)).status).toBe(204);
    expect((await ada.call('GET', at)).status).toBe(404);
  });
});
