import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Case, PlantReading, PlantRevision } from '@/contract';
import { aPlant, makeProject, made, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let mine: MadeProject;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
  mine = await makeProject(ada);
});
afterAll(() => app.close());

const coefficients = (numerator: unknown, denominator: unknown, deadTime: unknown = 0) => ({
  kind: 'coefficients',
  numerator,
  denominator,
  deadTime,
});

describe('plants', () => {
  it('are kept as they were entered', async () => {
    const { body } = await ada.call<PlantRevision>('GET', `${mine.at}/plants/${mine.plant.id}`);
    expect(body).toMatchObject({ ...aPlant, id: mine.plant.id, revision: 1, sensor: null, delayBudget: [], note: null, createdBy: 'ada' });
  });

  it('bring the case “nominal” with the first, and no other with the second', async () => {
    await made(ada, `${mine.at}/plants`, { ...aPlant, name: 'Dry' });
    const { body } = await ada.call<{ items: Case[]; nextCursor: null }>('GET', `${mine.at}/cases`);
    expect(body).toEqual({
      items: [
        {
          id: expect.any(String),
          name: 'nominal',
          plantId: mine.plant.id,
          plantRevision: null,
          parameters: {},
          axes: {},
          basis: 'extrapolated',
          etag: '"1"',
        },
      ],
      nextCursor: null,
    });
  });

  it('add a revision and keep those before it', async () => {
    const plant = await made<PlantRevision>(ada, `${mine.at}/plants`, aPlant);
    const at = `${mine.at}/plants/${plant.id}`;
    const next = {
      plant: coefficients([2.4], [0.35, 1, 0], 0.1),
      deadTimeBasis: 'assumed',
      note: 'tyres warm',
      name: 'Damp',
      baseRevision: 1,
    };
    const second = await made<PlantRevision>(ada, `${at}/revisions`, next);
    expect(second).toMatchObject({
      id: plant.id,
      revision: 2,
      name: 'Damp',
      note: 'tyres warm',
      plant: { numerator: [2.4], deadTime: 0.1 },
    });
    expect((await ada.call<PlantRevision>('GET', `${at}/revisions/1`)).body).toEqual({ ...plant, name: 'Damp' });
    const { body } = await ada.call<{ items: PlantRevision[] }>('GET', `${at}/revisions`);
    expect(body.items.map(({ revision }) => revision)).toEqual([2, 1]);
    expect((await ada.call('GET', `${at}/revisions/3`)).status).toBe(404);
    expect((await ada.call('GET', `${at}/revisions/0`)).status).toBe(404);
  });

  it('refuse a revision on top of one that is no longer the latest', async () => {
    const plant = await made<PlantRevision>(ada, `${mine.at}/plants`, aPlant);
    const path = `${mine.at}/plants/${plant.id}/revisions`;
    const { name: _name, ...content } = aPlant;
    const both = await Promise.all([1, 2].map(() => ada.call('POST', path, { ...content, baseRevision: 1 })));
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(await ada.call('POST', path, { ...content, baseRevision: 1 })).toMatchObject({
      status: 409,
      body: { errors: [{ pointer: '/baseRevision', detail: expect.stringContaining('Revision 2 is the latest now') }] },
    });
    expect((await ada.call('POST', path, { ...content, baseRevision: 7 })).status).toBe(409);
  });

  it('never change what a revision says, not even by SQL', async () => {
    expect(() => app.db.run(`update plant_revision set note = 'changed'`)).toThrow();
  });

  it('are read back factored and in words', async () => {
    const { status, body } = await ada.call<PlantReading>('POST', '/api/plants/read', { plant: coefficients([4], [1, 3, 2], 0.5) });
    expect(status).toBe(200);
    expect(body).toMatchObject({ gain: 4, zeros: [], deadTime: 0.5, numerator: [4], denominator: [1, 3, 2] });
    expect(body.poles.map(({ re }) => re).sort()).toEqual([-1, -2]);
    expect(body.words).toMatch(/dead time/i);
  });

  it('of another project are not found under this one', async () => {
    const other = await makeProject(ada, 'Other');
    for (const path of ['', '/revisions', '/revisions/1'])
      expect((await ada.call('GET', `${mine.at}/plants/${other.plant.id}${path}`)).status).toBe(404);
    const { name: _name, ...content } = aPlant;
    expect((await ada.call('POST', `${mine.at}/plants/${other.plant.id}/revisions`, { ...content, baseRevision: 1 })).status).toBe(404);
  });

  const many = Array.from({ length: 10_000 }, () => 1);
  it.each([
    ['a negative dead time', coefficients([1], [1, 1], -0.1), 422, '/plant/deadTime'],
    ['an absurd dead time', coefficients([1], [1, 1], 1e5), 422, '/plant/deadTime'],
    ['an empty denominator', coefficients([1], []), 422, '/plant/denominator'],
    ['a zero denominator', coefficients([1], [0, 0]), 422, '/plant/denominator'],
    ['a zero numerator', coefficients([0], [1, 1]), 422, '/plant/numerator'],
    ['NaN, which JSON writes as null', coefficients([NaN], [1, 1]), 400, '/plant/numerator/0'],
    ['a number in words', coefficients(['one'], [1, 1]), 400, '/plant/numerator/0'],
    ['10,000 coefficients', coefficients([1], many), 422, '/plant/denominator'],
    ['a coefficient beyond all measure', coefficients([1e31], [1, 1]), 422, '/plant/numerator/0'],
    ['a kind nobody knows', { kind: 'spline' }, 422, '/plant/kind'],
    ['no plant at all', undefined, 400, '/plant'],
  ])('refuse %s, and say where', async (_what, plant, status, pointer) => {
    for (const [path, body] of [
      ['/api/plants/read', { plant }],
      [`${mine.at}/plants`, { ...aPlant, plant }],
      ['/api/loops/analyse', { plant, controller: { form: 'parallel', kp: 1 } }],
    ] as const) {
      const reply = await ada.call<{ errors: { pointer: string }[] }>('POST', path, body);
      expect([path, reply.status, reply.body.errors[0].pointer]).toEqual([path, status, pointer]);
      expect(reply.headers.get('content-type')).toMatch('application/problem+json');
    }
  });

  it('refuse an improper plant wherever it is entered, and say where', async () => {
    const plant = coefficients([1, 0, 0], [1, 1]);
    const { name: _name, ...content } = aPlant;
    for (const [path, body] of [
      ['/api/plants/read', { plant }],
      [`${mine.at}/plants`, { ...aPlant, plant }],
      [`${mine.at}/plants/${mine.plant.id}/revisions`, { ...content, plant, baseRevision: 1 }],
      ['/api/loops/analyse', { plant, controller: { form: 'parallel', kp: 1 } }],
    ] as const)
      expect(await ada.call('POST', path, body)).toMatchObject({
        status: 422,
        body: { errors: [{ pointer: '/plant/numerator' }] },
      });
  });
});
