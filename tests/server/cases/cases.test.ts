import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Activity, Case, CreateCase, PlantRevision, ProblemDetails } from '@/contract';
import { aPlant, made, makeProject, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let mine: MadeProject;
let at: string;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
});
afterAll(() => app.close());
beforeEach(async () => {
  mine = await makeProject(ada);
  at = `${mine.at}/cases`;
});

const add = (parts: Partial<CreateCase> & Record<string, unknown> = {}) =>
  ada.call<Case & ProblemDetails>('POST', at, { name: 'heavy', plantId: mine.plant.id, ...parts });
const list = async () => (await ada.call<{ items: Case[] }>('GET', at)).body.items;
const enterFormula = () =>
  made<PlantRevision>(ada, `${mine.at}/plants`, {
    ...aPlant,
    name: 'By mass',
    plant: { kind: 'formula', text: 'k/(m*s + c)', parameters: { k: 2, m: 1.5, c: 0.02 } },
  });

describe('a case', () => {
  it('is added behind the others, extrapolated unless someone says otherwise', async () => {
    const { status, body, headers } = await add({ parameters: { gainFactor: 0.9, deadTime: 0.1 }, axes: { speed: 20, mass: 1640 } });
    expect(status).toBe(201);
    expect(body).toEqual({
      id: expect.any(String),
      name: 'heavy',
      plantId: mine.plant.id,
      plantRevision: null,
      parameters: { gainFactor: 0.9, deadTime: 0.1 },
      axes: { speed: 20, mass: 1640 },
      basis: 'extrapolated',
      etag: headers.get('etag'),
    });
    expect((await list()).map(({ name }) => name)).toEqual(['nominal', 'heavy']);
    expect((await ada.call<Case>('GET', `${at}/${body.id}`)).body).toEqual(body);
  });

  it('is changed by whoever saw it last, and the other is told', async () => {
    const { body } = await add();
    const change = (name: string) => ada.call<Case & ProblemDetails>('PATCH', `${at}/${body.id}`, { name }, { 'if-match': body.etag });
    const changed = await change('heavier');
    expect(changed.body).toEqual({ ...body, name: 'heavier', etag: changed.headers.get('etag') });
    expect((await change('lighter')).status).toBe(412);
    expect((await ada.call('PATCH', `${at}/${body.id}`, { name: 'x' })).status).toBe(428);
    expect((await list())[1].name).toBe('heavier');
  });

  it('sets a formula’s own parameters by name', async () => {
    const plant = await enterFormula();
    expect((await add({ plantId: plant.id, parameters: { m: 1.38 } })).status).toBe(201);
    const { status, body } = await add({ plantId: plant.id, parameters: { m: 1.38, drag: 2 } });
    expect([status, body.errors]).toEqual([
      422,
      [{ pointer: '/parameters/drag', detail: expect.stringContaining('may set gainFactor, deadTime, k, m, c') }],
    ]);
  });

  it('has no parameters of a formula where the plant is none', async () => {
    const { status, body } = await add({ parameters: { m: 1500 } });
    expect([status, body.errors]).toMatchObject([422, [{ pointer: '/parameters/m' }]]);
  });

  it.each([
    ['makes the plant improper', { m: 0, c: 0 }, '/parameters'],
    ['makes the plant zero', { k: 0 }, '/parameters/k'],
  ])('is refused where it %s', async (_name, parameters, pointer) => {
    const plant = await enterFormula();
    const { status, body } = await add({ plantId: plant.id, parameters });
    expect([status, body.errors]).toMatchObject([422, [{ pointer }]]);
    expect(await list()).toHaveLength(1);
  });

  it.each([
    ['no gain at all', { gainFactor: 0 }, '/parameters/gainFactor'],
    ['a dead time before its cause', { deadTime: -0.1 }, '/parameters/deadTime'],
  ])('is refused with %s', async (_name, parameters, pointer) => {
    const { status, body } = await add({ parameters });
    expect([status, body.errors]).toMatchObject([422, [{ pointer }]]);
  });

  it('names a plant of its own project, and a revision that there is', async () => {
    const revision = await add({ plantRevision: 3 });
    expect([revision.status, revision.body.errors]).toMatchObject([422, [{ pointer: '/plantRevision' }]]);
    const other = await makeProject(ada, 'Another');
    expect((await add({ plantId: other.plant.id })).status).toBe(404);
    const [nominal] = await list();
    const moved = await ada.call('PATCH', `${at}/${nominal.id}`, { plantId: other.plant.id }, { 'if-match': nominal.etag });
    expect(moved.status).toBe(404);
  });

  it('is taken away unless it is the last', async () => {
    const [nominal] = await list();
    const last = await ada.call<ProblemDetails>('DELETE', `${at}/${nominal.id}`, undefined, { 'if-match': nominal.etag });
    expect([last.status, last.body.detail]).toEqual([409, 'This is the project’s last case: change it, or add another first.']);
    await add();
    expect((await ada.call('DELETE', `${at}/${nominal.id}`, undefined, { 'if-match': nominal.etag })).status).toBe(204);
    expect((await list()).map(({ name }) => name)).toEqual(['heavy']);
    const { body } = await ada.call<{ items: Activity[] }>('GET', `${mine.at}/activity`);
    expect(body.items.slice(0, 2).map(({ action }) => action)).toEqual(['case.removed', 'case.added']);
  });

  it('that ends nothing is judged with its plant, and says so once it no longer goes with it', async () => {
    const plant = await enterFormula();
    await add({ plantId: plant.id, parameters: { m: 1.38 }, name: 'light' });
    const { name: _name, ...content } = aPlant;
    await made(ada, `${mine.at}/plants/${plant.id}/revisions`, { ...content, baseRevision: 1 });
    const { status, body } = await ada.call<ProblemDetails>('POST', `${mine.at}/analyses`, { designId: mine.design.id });
    expect([status, body.detail]).toEqual([409, expect.stringContaining('“light” does not go with its plant any more')]);
  });

  it('of someone else’s project is not there', async () => {
    const ben = await app
      .client('ben')
      .signUp()
      .catch(() => app.client('ben').signIn());
    const theirs = await makeProject(ben);
    const [nominal] = await list();
    for (const base of [at, `${theirs.at}/cases`]) {
      expect((await ben.call('GET', `${base}/${nominal.id}`)).status).toBe(404);
      expect((await ben.call('PATCH', `${base}/${nominal.id}`, { name: 'x' }, { 'if-match': '*' })).status).toBe(404);
      expect((await ben.call('DELETE', `${base}/${nominal.id}`, undefined, { 'if-match': '*' })).status).toBe(404);
    }
  });
});
