import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
});
afterAll(() => app.close());

/** The 2 s of the watchdog, and the start of the worker that replaces one, on a machine that does other things too. */
const LONGEST_MS = 8000;

const pid = { form: 'parallel', kp: 1.2, ki: 0.4, kd: 0.1, derivativeFilterTime: 0.02 };
const plant = (numerator: number[], denominator: number[], deadTime = 0) => ({
  kind: 'coefficients',
  numerator,
  denominator,
  deadTime,
});
/** (s + 1)ⁿ. */
const binomial = (order: number) =>
  Array.from({ length: order }).reduce<number[]>((row) => [...row, 0].map((c, i) => c + (row[i - 1] ?? 0)), [1]);
/** Numbers spread over forty decades, the same ones every time. */
const wild = (count: number, seed: number) =>
  Array.from({ length: count }, (_, i) => Math.sin(seed + 12.9898 * i) * 10 ** (20 * Math.sin(78.233 * i + seed)));

/** 25 coefficients, each a tenth of the one before. */
const decades = Array.from({ length: 25 }, (_, i) => 10 ** -i);

/** Answers the reply, after having seen that it came in time and is either numbers or a problem that says where. */
async function analyse(loop: object) {
  const start = performance.now();
  const reply = await ada.call('POST', '/api/loops/analyse?curves=false', loop);
  expect(performance.now() - start).toBeLessThan(LONGEST_MS);
  expect([200, 422]).toContain(reply.status);
  if (reply.status === 422) {
    expect(reply.headers.get('content-type')).toMatch('application/problem+json');
    expect(reply.body).toMatchObject({ errors: [{ pointer: expect.stringMatching(/^[#/]/), detail: expect.any(String) }] });
  }
  return reply;
}

describe('a loop at the end of what can be computed is answered in time, by numbers or a pointer', () => {
  it.each<[string, object]>([
    ['a leading coefficient of almost nothing', plant([1], [1e-300, 1])],
    ['a last coefficient of almost nothing', plant([1e-300], [1, 1e-300])],
    ['the least number there is', plant([5e-324], [1, 5e-324])],
    ['the greatest coefficients', plant([1e30, 1e30], [1e30, 1e-30, 1e30])],
    ['a long dead time behind a fast pole', plant([1], [1e-6, 1], 1e4)],
    ['a long dead time behind an integrator', plant([1], [1, 0], 1e4)],
    ['coefficients over 24 decades and a long dead time', plant([1], decades, 1e4)],
    ['24 equal poles', plant([1], binomial(24))],
    ['12 equal poles and dead time', plant([1], binomial(12), 3)],
    ['an undamped pair and two integrators', plant([1], [1, 0, 1, 0, 0])],
    ['a pair that is all but undamped', plant([1], [1, 1e-9, 1])],
    ['25 coefficients over forty decades', plant(wild(24, 1), wild(25, 2))],
    ['others, with dead time', plant(wild(25, 3), wild(25, 4), 7)],
  ])('%s', async (_what, extreme) => {
    await analyse({ plant: extreme, controller: pid });
  });

  it.each<[string, object]>([
    ['a filter of almost no time', { derivativeFilterTime: 1e-300 }],
    ['the greatest gains', { kp: 1e12, ki: 1e12, kd: 1e12 }],
    ['the least gains', { kp: 1e-300, ki: 1e-300, kd: 1e-300 }],
  ])('%s', async (_what, gains) => {
    await analyse({ plant: plant([2.1], [0.35, 1, 0], 0.08), controller: { ...pid, ...gains } });
  });

  it('says of motions too far apart that they are', async () => {
    const { status, body } = await analyse({ plant: plant([1], [1e-300, 1]), controller: pid });
    expect(status).toBe(422);
    expect(body.detail).toMatch('too far apart');
  });
});

describe('a number that is no coefficient is refused at its place', () => {
  const written = (text: string) => JSON.stringify({ plant: plant([4711], [1, 1]), controller: pid }).replace('4711', text);

  it.each([
    ['NaN', 400, '#'],
    ['1e999', 400, '/plant/numerator/0'],
    ['"NaN"', 400, '/plant/numerator/0'],
    ['null', 400, '/plant/numerator/0'],
    ['1e308', 422, '/plant/numerator/0'],
  ])('%s', async (text, status, pointer) => {
    const reply = await ada.call('POST', '/api/loops/analyse', written(text));
    expect(reply.status).toBe(status);
    expect(reply.body).toMatchObject({ errors: [{ pointer }] });
  });

  it.each([
    ['__proto__', `{"__proto__":{"kp":1},"plant":${JSON.stringify(plant([1], [1, 1]))},"controller":${JSON.stringify(pid)}}`],
    ['constructor', JSON.stringify({ plant: plant([1], [1, 1]), controller: pid, constructor: 1 })],
  ])('a field named %s', async (name, body) => {
    expect((await ada.call('POST', '/api/loops/analyse', body)).body).toMatchObject({ status: 400, errors: [{ pointer: `/${name}` }] });
  });

  it.each(['[', '{"a":'])('60,000 times %s', async (opening) => {
    const closing = opening === '[' ? ']' : '}';
    const body = `{"plant":${opening.repeat(60_000)}1${closing.repeat(60_000)}}`;
    expect((await ada.call('POST', '/api/loops/analyse', body)).body).toMatchObject({ status: 400 });
  });
});
