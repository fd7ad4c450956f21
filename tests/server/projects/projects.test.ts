import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Me, Project } from '@/contract';
import { addMember } from '@/db/stores/member-store';
import { makeProject, made } from '../../support/a-project';
import type { Client, Reply } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let ben: Client;
beforeAll(async () => {
  app = await startTestApp();
  [ada, ben] = [await app.client('ada').signUp(), await app.client('ben').signUp()];
});
afterAll(() => app.close());

type List = { items: Project[]; nextCursor: string | null };
const newProject = (name: string) => made<Project>(ada, '/api/projects', { name });

describe('projects', () => {
  it('belong to their maker and the maker’s own team', async () => {
    const me = await ada.call<Me>('GET', '/api/me');
    const reply = await ada.call<Project>('POST', '/api/projects', { name: 'Pit lane', vehicle: 'Heron 14', description: '60 km/h' });
    expect(reply.status).toBe(201);
    expect(reply.headers.get('etag')).toBe('"1"');
    expect(reply.body).toMatchObject({
      name: 'Pit lane',
      vehicle: 'Heron 14',
      role: 'owner',
      archived: false,
      headline: null,
      latestAnalysis: null,
    });
    expect(reply.body.team).toEqual({ id: me.body.teams[0].id, name: me.body.teams[0].name });
    expect(reply.body.people).toEqual([{ id: me.body.id, name: 'ada', role: 'owner' }]);
  });

  it('show their headline once something was analysed', async () => {
    const { at, design } = await makeProject(ada);
    const kept = await made<{ id: string }>(ada, `${at}/analyses`, { designId: design.id });
    const { body } = await ada.call<Project>('GET', at);
    expect(body.headline).toMatchObject({ quantity: 'ms', verdict: 'notJudged', reason: 'No limits are set.', case: { name: 'nominal' } });
    // From api.md, the analysis of this very loop.
    expect(body.headline!.value).toBeCloseTo(1.5598, 4);
    expect(body.latestAnalysis).toMatchObject({ id: kept.id, design: { id: design.id, name: 'Speed hold', revision: 1 } });
  });

  it('are listed page by page, the one worked on last first, each once', async () => {
    const cleo = await app.client('cleo').signUp();
    for (let i = 0; i < 5; i += 1) await made(cleo, '/api/projects', { name: `Loop ${i}` });
    const names: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const reply: Reply<List> = await cleo.call<List>('GET', `/api/projects?limit=2${cursor && `&cursor=${cursor}`}`);
      expect(reply.body.items.length).toBeLessThanOrEqual(2);
      names.push(...reply.body.items.map(({ name }) => name));
      cursor = reply.body.nextCursor;
    }
    expect(names).toEqual(['Loop 4', 'Loop 3', 'Loop 2', 'Loop 1', 'Loop 0']);
  });

  it('refuse a page that no list gave', async () => {
    for (const query of ['limit=0', 'limit=201', 'limit=two', 'cursor=yesterday', 'archived=maybe'])
      expect([400, 422]).toContain((await ada.call('GET', `/api/projects?${query}`)).status);
  });

  it('change only in the hands of someone who saw the latest version', async () => {
    const { id } = await newProject('Torque');
    const change = { name: 'Rear-axle torque', description: 'quiet half-shafts' };
    expect((await ada.call('PATCH', `/api/projects/${id}`, change)).status).toBe(428);
    const changed = await ada.call<Project>('PATCH', `/api/projects/${id}`, change, { 'if-match': '"1"' });
    expect(changed).toMatchObject({ status: 200, body: change });
    expect(changed.headers.get('etag')).toBe('"2"');
    expect((await ada.call('PATCH', `/api/projects/${id}`, { name: 'Lost' }, { 'if-match': '"1"' })).status).toBe(412);
    expect((await ada.call<Project>('GET', `/api/projects/${id}`)).body.name).toBe('Rear-axle torque');
  });

  it('leave the list for the archive and come back', async () => {
    const { id } = await newProject('Last year');
    const listed = async (query: string) =>
      (await ada.call<List>('GET', `/api/projects${query}`)).body.items.some((item) => item.id === id);
    await ada.call('PATCH', `/api/projects/${id}`, { archived: true }, { 'if-match': '"1"' });
    expect([await listed(''), await listed('?archived=true')]).toEqual([false, true]);
    await ada.call('PATCH', `/api/projects/${id}`, { archived: false }, { 'if-match': '"2"' });
    expect([await listed(''), await listed('?archived=true')]).toEqual([true, false]);
  });

  it('are renamed by an editor, but archived and deleted by an owner alone', async () => {
    const { id } = await newProject('Shared');
    const dora = await app.client('dora').signUp();
    const { body: me } = await dora.call<Me>('GET', '/api/me');
    addMember(app.db, { projectId: id, userId: me.id, role: 'editor' }, new Date());
    const change = (body: object) => dora.call('PATCH', `/api/projects/${id}`, body, { 'if-match': '*' });
    expect((await change({ name: 'Shared loop' })).status).toBe(200);
    expect((await change({ archived: true })).status).toBe(403);
    expect((await dora.call('DELETE', `/api/projects/${id}`, { confirmName: 'Shared loop' }, { 'if-match': '*' })).status).toBe(403);
  });

  it('go only after their name is repeated, with everything in them', async () => {
    const { at, project, design } = await makeProject(ada, 'To be deleted');
    await made(ada, `${at}/analyses`, { designId: design.id });
    const headers = { 'if-match': '"1"' };
    expect((await ada.call('DELETE', at, { confirmName: project.name })).status).toBe(428);
    expect(await ada.call('DELETE', at, { confirmName: 'to be deleted' }, headers)).toMatchObject({
      status: 422,
      body: { errors: [{ pointer: '/confirmName' }] },
    });
    expect((await ada.call('DELETE', at, { confirmName: project.name }, headers)).status).toBe(204);
    expect((await ada.call('GET', at)).status).toBe(404);
    expect((await ada.call('GET', `${at}/designs/${design.id}`)).status).toBe(404);
  });

  it('are nobody else’s to see, change, delete or fill', async () => {
    const { at, plant, design } = await makeProject(ada);
    const { id: analysisId } = await made<{ id: string }>(ada, `${at}/analyses`, { designId: design.id });
    const paths: [string, string, unknown?][] = [
      ['GET', at],
      ['PATCH', at, { name: 'Mine' }],
      ['DELETE', at, { confirmName: 'Wet-track speed hold' }],
      ['GET', `${at}/plants`],
      ['POST', `${at}/plants`, {}],
      ['GET', `${at}/plants/${plant.id}`],
      ['GET', `${at}/plants/${plant.id}/revisions/1`],
      ['POST', `${at}/plants/${plant.id}/revisions`, {}],
      ['GET', `${at}/designs/${design.id}/revisions`],
      ['POST', `${at}/designs/${design.id}/revisions`, {}],
      ['GET', `${at}/cases`],
      ['GET', `${at}/activity`],
      ['GET', `${at}/analyses/${analysisId}`],
      ['POST', `${at}/analyses/${analysisId}/recompute`],
      ['POST', `${at}/analyses`, {}],
    ];
    for (const [method, path, body] of paths)
      expect([path, (await ben.call(method, path, body, { 'if-match': '*' })).status]).toEqual([path, 404]);
    expect((await ben.call<List>('GET', '/api/projects')).body.items).toEqual([]);
  });

  it('cannot be made in a team of someone else', async () => {
    const { body } = await ada.call<Me>('GET', '/api/me');
    expect((await ben.call('POST', '/api/projects', { name: 'Intruder', teamId: body.teams[0].id })).status).toBe(404);
  });

  it('name what is wrong with a body', async () => {
    expect(await ada.call('POST', '/api/projects', {})).toMatchObject({ status: 400, body: { errors: [{ pointer: '/name' }] } });
    expect(await ada.call('POST', '/api/projects', { name: '  ' })).toMatchObject({
      status: 422,
      body: { errors: [{ pointer: '/name' }] },
    });
    expect(await ada.call('POST', '/api/projects', { name: 'Loop', colour: 'red' })).toMatchObject({
      status: 400,
      body: { errors: [{ pointer: '/colour' }] },
    });
  });

  it('carry any name of one line as it was written', async () => {
    for (const name of ['Ω, αβγ, 速度', '<b>bold</b> & "quoted"', 'x'.repeat(120), 'smile 🙂'])
      expect((await ada.call<Project>('POST', '/api/projects', { name })).body.name).toBe(name);
  });

  it.each([
    ['a zero byte', '"a\\u0000b"'],
    ['half a character', '"a\\ud800b"'],
    ['a line end', '"a\\nb"'],
    ['a turn of direction', '"a\\u202eb"'],
    ['121 characters', JSON.stringify('x'.repeat(121))],
    ['blanks alone', '"   "'],
  ])('refuse a name with %s', async (_what, name) => {
    const { body } = await ada.call('POST', '/api/projects', `{"name":${name}}`);
    expect(body).toMatchObject({ status: 422, errors: [{ pointer: '/name' }] });
  });

  it('are made once per Idempotency-Key', async () => {
    const headers = { 'idempotency-key': 'first-light' };
    const first = await ada.call<Project>('POST', '/api/projects', { name: 'Once' }, headers);
    const again = await ada.call<Project>('POST', '/api/projects', { name: 'Once' }, headers);
    expect(again).toMatchObject({ status: 201, body: first.body });
    expect((await ada.call('POST', '/api/projects', { name: 'Twice' }, headers)).status).toBe(422);
    const { body } = await ada.call<List>('GET', '/api/projects?limit=200');
    expect(body.items.filter(({ name }) => name === 'Once')).toHaveLength(1);
  });
});
