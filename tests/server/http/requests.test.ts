import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { CreatePlant } from '@/contract';
import { answer } from '@/server/http/answer';
import { etagOf } from '@/server/http/etag';
import { route } from '@/server/http/route';
import { startTestApp, type TestApp } from '../../support/test-app';

const open = { tag: 'Test', summary: 'for the test', access: 'public' } as const;
let version = 1;

const routes = [
  route({
    ...open,
    method: 'post',
    path: '/api/plants',
    input: { body: CreatePlant },
    output: z.object({ name: z.string() }),
    handler: ({ body }) => body,
  }),
  route({
    ...open,
    method: 'get',
    path: '/api/list',
    input: { query: z.strictObject({ limit: z.coerce.number().int().min(1).max(200).default(50) }) },
    output: z.object({ limit: z.int() }),
    handler: ({ query }) => query,
  }),
  route({
    ...open,
    method: 'put',
    path: '/api/shared-thing',
    output: z.object({ version: z.int() }),
    handler: ({ expectVersion }) => {
      expectVersion(version);
      version += 1;
      return answer({ version }, { etag: etagOf(version) });
    },
  }),
  route({
    ...open,
    method: 'get',
    path: '/api/thing/:thingId',
    input: { params: z.object({ thingId: z.uuid() }) },
    output: z.object({ thingId: z.string() }),
    handler: ({ params }) => params,
  }),
  route({
    ...open,
    method: 'get',
    path: '/api/fault',
    output: z.object({}),
    handler: () => {
      throw new Error('the password is hunter2');
    },
  }),
];

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp({ routes, config: { checkAnswers: false } });
});
afterAll(() => app.close());

const call: ReturnType<TestApp['client']>['call'] = (...request) => app.client('anyone').call(...request);
const plant = { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 };

describe('a body', () => {
  it.each([
    ['that is not JSON', '{"name":', 400, '#'],
    ['that is no object', '"name"', 400, '#'],
    ['that is a list', [], 400, '#'],
    ['without a field it needs', { plant }, 400, '/name'],
    ['with a field nobody knows', { name: 'p', plant, colour: 'red' }, 400, '/colour'],
    ['with an unknown field deep inside', { name: 'p', plant: { ...plant, order: 2 } }, 400, '/plant/order'],
    ['with text for a number', { name: 'p', plant: { ...plant, deadTime: '0.08' } }, 400, '/plant/deadTime'],
    ['with null for a number', { name: 'p', plant: { ...plant, numerator: [null] } }, 400, '/plant/numerator/0'],
    ['with negative dead time', { name: 'p', plant: { ...plant, deadTime: -1 } }, 422, '/plant/deadTime'],
    ['with an empty denominator', { name: 'p', plant: { ...plant, denominator: [] } }, 422, '/plant/denominator'],
    ['with 10,000 coefficients', { name: 'p', plant: { ...plant, numerator: Array(10_000).fill(1) } }, 422, '/plant/numerator'],
    ['of a kind nobody knows', { name: 'p', plant: { kind: 'magic' } }, 422, '/plant/kind'],
    ['without a kind', { name: 'p', plant: {} }, 400, '/plant/kind'],
    ['with a unit as a number', { name: 'p', plant, units: { input: 1, output: 'm/s' } }, 400, '/units/input'],
  ])('%s is refused at its pointer', async (_what, body, status, pointer) => {
    const reply = await call('POST', '/api/plants', body, { 'content-type': 'application/json' });
    expect(reply.status).toBe(status);
    expect(reply.headers.get('content-type')).toContain('application/problem+json');
    expect(reply.body).toMatchObject({ status, errors: [{ pointer }] });
  });

  it('is refused where it is absent or not said to be JSON', async () => {
    expect((await call('POST', '/api/plants')).body).toMatchObject({ status: 400, errors: [{ pointer: '#' }] });
    expect((await call('POST', '/api/plants', 'name=p', { 'content-type': 'application/x-www-form-urlencoded' })).status).toBe(400);
  });

  it('is told everything that is wrong with it at once', async () => {
    const { body } = await call<{ errors: { pointer: string }[] }>('POST', '/api/plants', { plant: { ...plant, deadTime: -1 } });
    expect(body.errors.map(({ pointer }) => pointer)).toEqual(['/name', '/plant/deadTime']);
  });

  it('of 2 MB is refused, one just under 1 MB is read', async () => {
    const padded = (bytes: number) => JSON.stringify({ name: 'x'.repeat(bytes), plant });
    expect((await call('POST', '/api/plants', padded(2 << 20))).body).toMatchObject({ status: 413 });
    expect((await call('POST', '/api/plants', padded(1_000_000))).body).toMatchObject({ status: 422, errors: [{ pointer: '/name' }] });
  });
});

describe('a query', () => {
  it.each(['limit=0', 'limit=201', 'limit=many', 'offset=3', 'limit=1&limit=2'])('is refused: %s', async (query) => {
    expect([400, 422]).toContain((await call('GET', `/api/list?${query}`)).status);
  });

  it('is filled with its defaults', async () => {
    expect((await call('GET', '/api/list')).body).toEqual({ limit: 50 });
  });
});

describe('an address', () => {
  it('that does not exist is a problem, not a page', async () => {
    const { status, headers } = await call('GET', '/api/nothing/here');
    expect(status).toBe(404);
    expect(headers.get('content-type')).toContain('application/problem+json');
  });

  it('asked by another method says which ones it knows', async () => {
    const { status, headers } = await call('DELETE', '/api/plants');
    expect(status).toBe(405);
    expect(headers.get('allow')).toBe('POST');
  });

  it('whose id cannot be one names nothing', async () => {
    expect((await call('GET', '/api/thing/not-an-id')).status).toBe(404);
  });

  it('that cannot be decoded is refused', async () => {
    expect((await call('GET', '/api/thing/%E0%A4%A')).body).toMatchObject({ status: 400 });
  });
});

describe('a fault nobody foresaw', () => {
  it('is a problem that tells nothing of the inside', async () => {
    const { status, text } = await call('GET', '/api/fault');
    expect(status).toBe(500);
    expect(text).not.toContain('hunter2');
    expect(JSON.parse(text)).toMatchObject({ type: 'about:blank', title: 'Internal Server Error', status: 500 });
  });
});

describe('a thing that two people edit', () => {
  it('is changed only by who says the version they saw', async () => {
    expect((await call('PUT', '/api/shared-thing')).status).toBe(428);
    const first = await call('PUT', '/api/shared-thing', undefined, { 'if-match': '"1"' });
    expect(first.status).toBe(200);
    expect(first.headers.get('etag')).toBe('"2"');
    const stale = await call('PUT', '/api/shared-thing', undefined, { 'if-match': '"1"' });
    expect(stale.status).toBe(412);
    expect(stale.headers.get('etag')).toBe('"2"');
    expect((await call('PUT', '/api/shared-thing', undefined, { 'if-match': '"1", "2"' })).status).toBe(200);
    expect((await call('PUT', '/api/shared-thing', undefined, { 'if-match': 'W/"3"' })).status).toBe(412);
  });
});

describe('the origin of a change', () => {
  const from = async (origin: string) => (await call('POST', '/api/plants', { name: 'p', plant }, { origin })).status;

  it('is this site, by the request’s host or by BASE_URL', async () => {
    expect(await from(app.url)).toBe(200);
    expect(await from(app.context.config.baseUrl)).toBe(200);
  });

  it.each(['https://evil.example', 'null', '', 'http://127.0.0.1.evil.example', 'not a url'])('is not “%s”', async (origin) => {
    expect(await from(origin)).toBe(403);
  });

  it('does not matter for reading', async () => {
    expect((await call('GET', '/api/list', undefined, { origin: 'https://evil.example' })).status).toBe(200);
  });
});
