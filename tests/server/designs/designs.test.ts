import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DesignRevision, Project, RevisedDesign } from '@/contract';
import { aDesign, makeProject, made, type MadeProject } from '../../support/a-project';
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

const { name: _name, ...content } = aDesign;
const revisions = () => `${mine.at}/designs/${mine.design.id}/revisions`;
const latest = async () => (await ada.call<DesignRevision>('GET', `${mine.at}/designs/${mine.design.id}`)).body.revision;

describe('designs', () => {
  it('are kept as they were entered, with their author', async () => {
    const { body } = await ada.call<DesignRevision>('GET', `${mine.at}/designs/${mine.design.id}`);
    expect(body).toMatchObject({ name: 'Speed hold', revision: 1, sampling: 'continuous', actuator: null, note: null, createdBy: 'ada' });
    expect(body.controller).toMatchObject({ kp: 1.2, ki: 0.4, kd: 0.1, setpointWeights: { proportional: 1, derivative: 0 } });
  });

  it('keep a revision and its analysis in one step', async () => {
    const base = await latest();
    const controller = { ...aDesign.controller, kp: 1 };
    const kept = await made<RevisedDesign>(ada, revisions(), { ...content, controller, note: 'softer', baseRevision: base, analyse: true });
    expect(kept).toMatchObject({ revision: base + 1, note: 'softer', controller: { kp: 1 } });
    expect(kept.analysis).toMatchObject({ design: { id: mine.design.id, name: 'Speed hold', revision: base + 1 }, caseCount: 1 });
    expect(kept.analysis!.inputs.design.controller).toEqual(kept.controller);
    const { body } = await ada.call('GET', `${mine.at}/analyses/${kept.analysis!.id}`);
    expect(body).toEqual(kept.analysis);
  });

  it('keep neither the revision nor an analysis where another revision came first', async () => {
    const base = await latest();
    const both = await Promise.all([1, 2].map(() => ada.call('POST', revisions(), { ...content, baseRevision: base, analyse: true })));
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    const { body } = await ada.call<{ items: { design: { revision: number } }[] }>('GET', `${mine.at}/analyses`);
    expect(body.items.filter(({ design }) => design.revision === base + 1)).toHaveLength(1);
    expect(await latest()).toBe(base + 1);
  });

  it('keep neither where there is no case to analyse', async () => {
    const { id } = await made<Project>(ada, '/api/projects', { name: 'Empty' });
    const design = await made<DesignRevision>(ada, `/api/projects/${id}/designs`, aDesign);
    const path = `/api/projects/${id}/designs/${design.id}`;
    expect((await ada.call('POST', `${path}/revisions`, { ...content, baseRevision: 1, analyse: true })).status).toBe(409);
    expect((await ada.call<DesignRevision>('GET', path)).body.revision).toBe(1);
  });

  it('are made once per Idempotency-Key, also by a request that comes twice at once', async () => {
    const base = await latest();
    const send = () => ada.call('POST', revisions(), { ...content, baseRevision: base, analyse: true }, { 'idempotency-key': 'keep' });
    const both = await Promise.all([send(), send()]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect((await send()).body).toEqual(both.find(({ status }) => status === 201)!.body);
    expect(await latest()).toBe(base + 1);
  });

  it('list their revisions, newest first, page by page', async () => {
    const { body: first } = await ada.call<{ items: DesignRevision[]; nextCursor: string }>('GET', `${revisions()}?limit=2`);
    const { body: second } = await ada.call<{ items: DesignRevision[] }>('GET', `${revisions()}?limit=2&cursor=${first.nextCursor}`);
    const top = await latest();
    expect([...first.items, ...second.items].map(({ revision }) => revision)).toEqual([top, top - 1, top - 2, top - 3]);
    expect((await ada.call<DesignRevision>('GET', `${revisions()}/1`)).body).toEqual(mine.design);
  });

  it('never change what a revision says, not even by SQL', () => {
    expect(() => app.db.run(`update design_revision set note = 'changed'`)).toThrow();
  });

  it('of another project are not found under this one', async () => {
    const other = await makeProject(ada, 'Other');
    for (const path of ['', '/revisions', '/revisions/1'])
      expect((await ada.call('GET', `${mine.at}/designs/${other.design.id}${path}`)).status).toBe(404);
    expect((await ada.call('POST', `${mine.at}/designs/${other.design.id}/revisions`, { ...content, baseRevision: 1 })).status).toBe(404);
  });

  it.each([
    [
      'a negative filter time',
      { ...aDesign, controller: { form: 'parallel', kp: 1, derivativeFilterTime: -1 } },
      422,
      '/controller/derivativeFilterTime',
    ],
    ['a gain beyond all measure', { ...aDesign, controller: { form: 'parallel', kp: 1e13 } }, 422, '/controller/kp'],
    ['a gain that is missing', { ...aDesign, controller: { form: 'parallel' } }, 400, '/controller/kp'],
    ['a form nobody knows', { ...aDesign, controller: { form: 'fuzzy', kp: 1 } }, 422, '/controller/form'],
    [
      'a sample period of 0',
      { ...aDesign, sampling: { period: 0, integral: 'backward', derivative: 'backward' } },
      422,
      '/sampling/period',
    ],
    ['no revision to stand on', { ...content, analyse: true }, 400, '/baseRevision'],
  ])('refuse %s, and say where', async (_what, body, status, pointer) => {
    const path = 'name' in body ? `${mine.at}/designs` : revisions();
    const reply = await ada.call<{ errors: { pointer: string }[] }>('POST', path, body);
    expect([reply.status, reply.body.errors[0].pointer]).toEqual([status, pointer]);
  });

  it('refuse at the door what the engine cannot compute', async () => {
    const sampling = { period: 0.01, integral: 'backward', derivative: 'backward' };
    const notch = { kind: 'notch', frequency: 400, depth: 0.1, width: 0.3 };
    for (const [part, pointer] of [
      [{ sampling, controller: { form: 'parallel', kp: 1, filters: [notch] } }, '/controller/filters/0/frequency'],
      [{ actuator: { minimum: -1, maximum: 1 } }, '/actuator'],
    ] as const) {
      expect(await ada.call('POST', `${mine.at}/designs`, { ...aDesign, ...part })).toMatchObject({
        status: 422,
        body: { errors: [{ pointer }] },
      });
      expect(await ada.call('POST', revisions(), { ...content, ...part, baseRevision: await latest() })).toMatchObject({
        status: 422,
        body: { errors: [{ pointer }] },
      });
    }
    expect(await ada.call('POST', `${mine.at}/designs`, { ...aDesign, sampling })).toMatchObject({ status: 201 });
  });
});
