import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { answer } from '@/server/http/answer';
import { Conflict } from '@/server/http/problem';
import { route } from '@/server/http/route';
import { routes as productRoutes } from '@/server/routes';
import { startTestApp, type TestApp } from '../../support/test-app';

let made = 0;
const things = route({
  method: 'post',
  path: '/api/things',
  tag: 'Test',
  summary: 'for the test',
  access: 'session',
  input: { body: z.strictObject({ name: z.string(), slow: z.boolean().optional() }) },
  output: z.object({ number: z.int(), name: z.string() }),
  status: 201,
  handler: async ({ body }) => {
    if (body.name === 'taken') throw new Conflict('This name is taken.');
    made += 1;
    const number = made;
    if (body.slow) await new Promise((resolve) => setTimeout(resolve, 300));
    return answer({ number, name: body.name }, { etag: `"${number}"` });
  },
});

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp({ routes: [...productRoutes, things] });
  await app.client('Ada').signUp();
  await app.client('Bo').signUp();
});
afterAll(() => app.close());

const make = (who: string, key: string, body: object) => app.client(who).call('POST', '/api/things', body, { 'idempotency-key': key });

describe('an Idempotency-Key', () => {
  it('makes one thing of two requests, and answers the same again', async () => {
    const before = made;
    const first = await make('Ada', 'k1', { name: 'a' });
    const second = await make('Ada', 'k1', { name: 'a' });
    expect(made).toBe(before + 1);
    expect([second.status, second.text, second.headers.get('etag')]).toEqual([first.status, first.text, first.headers.get('etag')]);
    expect(first.status).toBe(201);
  });

  it('is not taken for another body', async () => {
    await make('Ada', 'k2', { name: 'a' });
    expect((await make('Ada', 'k2', { name: 'b' })).status).toBe(422);
  });

  it('is one person’s own', async () => {
    const ada = await make('Ada', 'k3', { name: 'a' });
    const bo = await make('Bo', 'k3', { name: 'a' });
    expect(bo.body.number).not.toBe(ada.body.number);
  });

  it('refuses a second request while the first still runs', async () => {
    const first = make('Ada', 'k4', { name: 'a', slow: true });
    await new Promise((resolve) => setTimeout(resolve, 120));
    expect((await make('Ada', 'k4', { name: 'a', slow: true })).status).toBe(409);
    expect((await first).status).toBe(201);
  });

  it('is free again after a refusal, which did nothing', async () => {
    expect((await make('Ada', 'k5', { name: 'taken' })).status).toBe(409);
    expect((await make('Ada', 'k5', { name: 'free' })).status).toBe(201);
  });

  it('makes a thing each time where there is none', async () => {
    const before = made;
    await app.client('Ada').call('POST', '/api/things', { name: 'a' });
    await app.client('Ada').call('POST', '/api/things', { name: 'a' });
    expect(made).toBe(before + 2);
  });
});
