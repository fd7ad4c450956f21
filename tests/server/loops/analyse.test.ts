import { fileURLToPath } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Analysis } from '@/contract';
import { createLoopPool } from '@/server/jobs/loop-pool';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
});
afterAll(() => app.close());

const loop = {
  plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
  controller: { form: 'parallel', kp: 1.2, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 },
};
const path = '/api/loops/analyse';
const pointers = ({ errors }: { errors?: { pointer: string }[] }) => errors?.map(({ pointer }) => pointer);

describe('POST /api/loops/analyse', () => {
  it('answers the numbers of this loop', async () => {
    const { status, body } = await ada.call<Analysis>('POST', path, loop);
    expect(status).toBe(200);
    expect(body.closedLoop).toMatchObject({ stable: true, unstablePoles: 0 });
    // Digits from the example in the API's description.
    expect(body.margins.gain!.factor).toBeCloseTo(11.681, 3);
    expect(body.margins.phase!.degrees).toBeCloseTo(45.319, 3);
    expect(body.margins.delay!.seconds).toBeCloseTo(0.38416, 5);
    expect(body.sensitivity.ms.value).toBeCloseTo(1.5598, 4);
    expect(body.timeResponse!.reference!.time.length).toBeGreaterThanOrEqual(1000);
  });

  it('leaves the curves out and the numbers as they are under ?curves=false', async () => {
    const { body: whole } = await ada.call<Analysis>('POST', path, loop);
    const { body: bare } = await ada.call<Analysis>('POST', `${path}?curves=false`, loop);
    expect(bare.frequencyResponse).toBeUndefined();
    expect(bare.timeResponse).toEqual({ metrics: whole.timeResponse!.metrics });
    expect([bare.margins, bare.sensitivity, bare.bandwidth]).toEqual([whole.margins, whole.sensitivity, whole.bandwidth]);
  });

  it('gives L exactly where it is asked for', async () => {
    const { body } = await ada.call<Analysis>('POST', path, { ...loop, at: [1] });
    const [{ re, im }] = body.at;
    // 2.1·e^(−0.08i)/(i(1 + 0.35i)) · (1.2 − 0.4i + 0.1i/(1 + 0.02i)), by hand.
    expect(Math.hypot(re, im)).toBeCloseTo((2.1 / Math.hypot(1, 0.35)) * Math.hypot(1.2 + 0.002 / 1.0004, -0.4 + 0.1 / 1.0004), 9);
  });

  it('needs a session and an origin of this site', async () => {
    expect((await app.client('stranger').call('POST', path, loop)).status).toBe(401);
    expect((await ada.call('POST', path, loop, { origin: 'https://elsewhere.example' })).status).toBe(403);
  });

  it.each([
    ['not JSON', '{"plant":', 400],
    ['an empty body', '', 400],
    ['a list', '[]', 400],
    ['2 MB', JSON.stringify({ ...loop, filler: 'x'.repeat(2 ** 21) }), 413],
  ])('refuses %s with a problem', async (_what, body, status) => {
    const reply = await ada.call('POST', path, body);
    expect(reply.status).toBe(status);
    expect(reply.headers.get('content-type')).toMatch('application/problem+json');
    expect(reply.body).toMatchObject({ status, title: expect.any(String), detail: expect.any(String) });
  });

  it('names every field that is wrong', async () => {
    const wrong = {
      plant: { ...loop.plant, deadTime: -1 },
      controller: { ...loop.controller, ki: 1e13 },
      responses: { duration: 0 },
      at: [0],
    };
    const reply = await ada.call('POST', path, wrong);
    expect(reply.status).toBe(422);
    expect(pointers(reply.body)).toEqual(['/plant/deadTime', '/controller/ki', '/responses/duration', '/at/0']);
    expect(pointers((await ada.call('POST', path, { ...loop, gain: 2 })).body)).toEqual(['/gain']);
  });

  it('tells an unstable loop', async () => {
    const { body } = await ada.call<Analysis>('POST', path, { ...loop, controller: { form: 'parallel', kp: 40 } });
    expect(body.closedLoop).toMatchObject({ stable: false, unstablePoles: 2 });
    expect(body.timeResponse?.metrics ?? null).toBeNull();
  });

  it('answers 429 with when to come back, past the limit of one user alone', async () => {
    const narrow = await startTestApp({ config: { analysePerMinute: 3 } });
    const [first, second] = [await narrow.client('first').signUp(), await narrow.client('second').signUp()];
    for (let i = 0; i < 3; i += 1) expect((await first.call('POST', `${path}?curves=false`, loop)).status).toBe(200);
    const refused = await first.call('POST', path, loop);
    expect(refused.status).toBe(429);
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0);
    expect((await second.call('POST', `${path}?curves=false`, loop)).status).toBe(200);
    await narrow.close();
  });

  it('answers 422 where a loop takes too long, and goes on', async () => {
    const filename = fileURLToPath(new URL('../../support/stubborn-worker.mjs', import.meta.url));
    const jobs = createLoopPool({ threads: 1, timeoutMs: 300, entry: { filename, execArgv: [] } });
    const slow = await startTestApp({ replaced: { jobs }, env: { CHECK_ANSWERS: '0' } });
    const cleo = await slow.client('cleo').signUp();
    const read = (deadTime: number) => cleo.call('POST', '/api/plants/read', { plant: { ...loop.plant, deadTime } });
    const stopped = await read(1);
    expect([stopped.status, pointers(stopped.body)]).toEqual([422, ['#']]);
    expect(stopped.body.detail).toMatch('took longer than 0.3 s');
    expect((await read(5)).status).toBe(200);
    expect((await read(2)).status).toBe(500);
    await slow.close();
  });
});
