import { fileURLToPath } from 'node:url';
import { afterEach, describe, expect, it } from 'vitest';
import { Loop, PlantModel } from '@/contract';
import { createLoopPool, type LoopPool, type LoopPoolOptions } from '@/server/jobs/loop-pool';

const stubborn = { filename: fileURLToPath(new URL('../../support/stubborn-worker.mjs', import.meta.url)), execArgv: [] };
const plant = (deadTime: number) => PlantModel.parse({ kind: 'coefficients', numerator: [1], denominator: [1, 1], deadTime });

const open: LoopPool[] = [];
const pool = (options: Partial<LoopPoolOptions>) => {
  const made = createLoopPool({ threads: 1, ...options });
  open.push(made);
  return made;
};
afterEach(() => Promise.all(open.splice(0).map((made) => made.close())));

describe('the worker pool', () => {
  it('computes with the engine on a thread, with curves or without', async () => {
    const jobs = pool({});
    const loop = Loop.parse({ plant: plant(0.1), controller: { form: 'parallel', kp: 1 } });
    const whole = await jobs.analyse(loop, { curves: true });
    expect(whole.frequencyResponse?.frequencies.length).toBeGreaterThan(50);
    const { frequencyResponse: _curves, timeResponse, ...numbers } = whole;
    const bare = await jobs.analyse(loop, { curves: false });
    expect(bare.frequencyResponse).toBeUndefined();
    expect(bare).toMatchObject({ ...numbers, timeResponse: timeResponse && { metrics: timeResponse.metrics } });
  });

  it('carries a refusal of the engine across with its pointer', async () => {
    const improper = PlantModel.parse({ kind: 'coefficients', numerator: [1, 0, 0], denominator: [1, 1] });
    await expect(pool({}).describe(improper)).rejects.toMatchObject({
      status: 422,
      errors: [{ pointer: expect.stringContaining('/plant/') }],
    });
  });

  it('ends a computation that takes too long, says so, and goes on with a new thread', async () => {
    const jobs = pool({ entry: stubborn, timeoutMs: 300 });
    await expect(jobs.describe(plant(1))).rejects.toMatchObject({
      status: 422,
      errors: [{ pointer: '#', detail: 'This loop took longer than 0.3 s to analyse and was stopped.' }],
    });
    expect(await jobs.describe(plant(7))).toEqual({ words: '7 s' });
  });

  it('counts from when the engine begins, so that waiting behind a slow loop costs nobody their own', async () => {
    const jobs = pool({ entry: stubborn, timeoutMs: 500 });
    const [slow, alsoSlow, quick] = await Promise.allSettled([jobs.describe(plant(1)), jobs.describe(plant(1)), jobs.describe(plant(5))]);
    expect([slow.status, alsoSlow.status, quick.status]).toEqual(['rejected', 'rejected', 'fulfilled']);
  });

  it('survives a computation that breaks or takes all memory', async () => {
    const jobs = pool({ entry: stubborn, timeoutMs: 20_000, memoryMb: 64 });
    await expect(jobs.describe(plant(2))).rejects.toThrow('broken');
    await expect(jobs.describe(plant(3))).rejects.toMatchObject({
      status: 422,
      errors: [{ pointer: '#', detail: 'This loop needs more memory than one analysis may take.' }],
    });
    expect(await jobs.describe(plant(4))).toEqual({ words: '4 s' });
  });

  it('lets only so many wait, and tells the rest to come back', async () => {
    const jobs = pool({ entry: stubborn, maxWaiting: 2, timeoutMs: 300 });
    const calls = await Promise.allSettled(Array.from({ length: 8 }, (_, index) => jobs.describe(plant(10 + index))));
    const refused = calls.flatMap((call) => (call.status === 'rejected' ? [call.reason] : []));
    expect(refused.length).toBeGreaterThanOrEqual(5);
    for (const reason of refused) expect(reason).toMatchObject({ status: 503, headers: { 'Retry-After': '2' } });
  });
});
