import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Job, JobAnswer, KeptAnalysis } from '@/contract';
import { createLoopPool } from '@/server/jobs/loop-pool';
import { makeProject, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let mine: MadeProject;

beforeAll(async () => {
  app = await startTestApp({ env: { ANSWER_WITHIN_MS: '0' }, replaced: { jobs: createLoopPool({ timeoutMs: 60_000 }) } });
  ada = await app.client('ada').signUp();
  mine = await makeProject(ada);
  const points = Array.from({ length: 10 }, (_, k) => ({ at: k + 1, parameters: { deadTime: 0.05 + k / 1000 } }));
  const masses = Array.from({ length: 8 }, (_, k) => ({ at: 1000 + k, parameters: { gainFactor: 1 + k / 100 } }));
  const lists = [
    { axis: 'speed', points },
    { axis: 'mass', points: masses },
  ];
  const { status } = await ada.call('POST', `${mine.at}/cases/grid`, { plantId: mine.plant.id, lists, replace: true });
  if (status !== 201) throw new Error(`The grid was answered ${status}.`);
});
afterAll(() => app.close());

const begin = async (headers: Record<string, string> = {}) => {
  const { status, body } = await ada.call<JobAnswer>('POST', `${mine.at}/analyses`, { designId: mine.design.id }, headers);
  expect(status).toBe(202);
  return body.job;
};

/** Every event until the stream ends. */
async function eventsOf(job: Job): Promise<Job[]> {
  const response = await fetch(`${app.url}/api/jobs/${job.id}/events`, { headers: { cookie: ada.cookie } });
  expect(response.headers.get('content-type')).toMatch(/^text\/event-stream/);
  const text = await response.text();
  return text.split('\n').flatMap((line) => (line.startsWith('data: ') ? [JSON.parse(line.slice(6)) as Job] : []));
}

const analyses = async () => (await ada.call<{ items: { id: string }[] }>('GET', `${mine.at}/analyses`)).body.items;

describe('a long analysis', () => {
  it('goes on as a job that tells how far it is, and ends with what was kept', async () => {
    const job = await begin();
    expect(job).toMatchObject({ kind: 'analysis', state: 'running', progress: { total: 320 }, result: null, problem: null });
    const events = await eventsOf(job);
    const done = events.map(({ progress }) => progress.done);
    expect(events.length).toBeGreaterThan(3);
    expect(done).toEqual([...done].sort((a, b) => a - b));
    const last = events.at(-1)!;
    expect(last).toMatchObject({ state: 'done', progress: { done: 320, total: 320 } });
    const { analysisId } = last.result!;
    const { body } = await ada.call<KeptAnalysis>('GET', `${mine.at}/analyses/${analysisId}`);
    expect(body.results).toHaveLength(80);
    expect((await ada.call<Job>('GET', `/api/jobs/${job.id}`)).body).toEqual(last);
    expect(await eventsOf(job)).toEqual([last]);
  });

  it('is stopped by whoever began it, and keeps nothing', async () => {
    const before = await analyses();
    const job = await begin();
    const { status, body } = await ada.call<Job>('DELETE', `/api/jobs/${job.id}`);
    expect([status, body.state]).toEqual([200, 'cancelled']);
    await new Promise((resolve) => setTimeout(resolve, 500));
    expect((await ada.call<Job>('GET', `/api/jobs/${job.id}`)).body).toMatchObject({ state: 'cancelled', result: null });
    expect(await analyses()).toEqual(before);
  });

  it('is nobody else’s to see or stop', async () => {
    const ben = await app.client('ben').signUp();
    const job = await begin();
    for (const [method, path] of [
      ['GET', ''],
      ['GET', '/events'],
      ['DELETE', ''],
    ])
      expect((await ben.call(method, `/api/jobs/${job.id}${path}`)).status).toBe(404);
    expect((await ada.call<Job>('GET', `/api/jobs/${job.id}`)).body.state).toBe('running');
    await ada.call('DELETE', `/api/jobs/${job.id}`);
    expect((await ada.call('GET', `/api/jobs/${crypto.randomUUID()}`)).status).toBe(404);
  });

  it('is begun once under one key', async () => {
    const key = { 'idempotency-key': 'once' };
    const job = await begin(key);
    expect((await begin(key)).id).toBe(job.id);
    await ada.call('DELETE', `/api/jobs/${job.id}`);
  });

  it('has company, but not too much of it', async () => {
    const jobs = [await begin(), await begin(), await begin(), await begin()];
    const { status, headers } = await ada.call('POST', `${mine.at}/analyses`, { designId: mine.design.id });
    expect([status, headers.get('retry-after')]).toEqual([429, '10']);
    for (const { id } of jobs) await ada.call('DELETE', `/api/jobs/${id}`);
  });

  it('keeps nothing in a project that was archived meanwhile, and says so', async () => {
    const before = await analyses();
    const job = await begin();
    const { headers } = await ada.call('GET', mine.at);
    expect((await ada.call('PATCH', mine.at, { archived: true }, { 'if-match': headers.get('etag')! })).status).toBe(200);
    expect((await eventsOf(job)).at(-1)).toMatchObject({ state: 'failed', result: null, problem: { status: 404 } });
    expect(await analyses()).toEqual(before);
  });
});
