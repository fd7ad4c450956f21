import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Analysis } from '@/contract';
import type { Client } from '../../support/client';
import { checkCurves, compareSamples } from '../../support/compare-curves';
import { compareNumbers } from '../../support/compare-numbers';
import { compareMetrics, compareSeries } from '../../support/compare-responses';
import { plainReferenceLoops } from '../../support/reference-loop';
import { startTestApp, type TestApp } from '../../support/test-app';

const loops = plainReferenceLoops();
const timed = loops.filter(({ time }) => time);

let app: TestApp;
let ada: Client;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
});
afterAll(() => app.close());

async function analyse(loop: object): Promise<Analysis> {
  const { status, body, text } = await ada.call<Analysis>('POST', '/api/loops/analyse', loop);
  if (status !== 200) throw new Error(`${status}: ${text}`);
  return body;
}

describe('reference loops over HTTP', () => {
  it('are there', () => {
    expect(loops.length).toBeGreaterThanOrEqual(20);
    expect(timed.length).toBeGreaterThanOrEqual(5);
  });

  it.each(loops)('$id, $title: every number and the curves', async ({ loop, expect: expected }) => {
    const samples = expected.samples ?? [];
    const analysis = await analyse({ ...loop, at: samples.map(({ frequency }) => frequency) });
    expect([...compareNumbers(analysis, expected), ...compareSamples(analysis, samples), ...checkCurves(analysis)]).toEqual([]);
  });

  it.each(timed)('$id, $title: the metrics on its own axis, the responses on a longer one', async ({ loop, time }) => {
    expect(compareMetrics(await analyse(loop), time!)).toEqual([]);
    const duration = 1.02 * Math.max(...time!.times);
    expect(compareSeries(await analyse({ ...loop, responses: { duration } }), time!)).toEqual([]);
  });

  it('would be missed by a comparison that is given another loop', async () => {
    const [first, second] = loops;
    expect(compareNumbers(await analyse(first.loop), second.expect).length).toBeGreaterThan(5);
  });
});
