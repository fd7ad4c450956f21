import { describe, expect, it } from 'vitest';
import { LoopError } from '@/analysis';
import type { EngineReply, EngineRequest } from '@/components/bench/engine/engine-messages';
import { type EngineWorker, workerEngine } from '@/components/bench/engine/worker-engine';
import { Loop } from '@/contract';

const loop = Loop.parse({
  plant: { kind: 'coefficients', numerator: [1], denominator: [1, 1], deadTime: 0.1 },
  controller: { form: 'parallel', kp: 2, ki: 1 },
});
const question = { loop, detail: 'outline', end: null } as const;

/** A worker whose replies the test sends. */
function fakeWorker() {
  const requests: EngineRequest[] = [];
  const worker: EngineWorker = { postMessage: (request: EngineRequest) => void requests.push(request), onmessage: null, onerror: null };
  const reply = (data: EngineReply) => worker.onmessage!.call(worker as Worker, { data } as MessageEvent);
  const fail = () => worker.onerror!.call(worker as Worker, new Event('error') as ErrorEvent);
  return { worker, requests, reply, fail };
}

describe('the engine in a worker', () => {
  it('gives each asker its own answer', async () => {
    const { worker, requests, reply } = fakeWorker();
    const engine = workerEngine(worker);
    const [first, second] = [engine.run('analyse', question), engine.run('analyse', question)];
    const [one, two] = requests.map(({ id }) => id);
    reply({ id: two, output: 'second' as never });
    reply({ id: one, output: 'first' as never });
    expect(await Promise.all([first, second])).toEqual(['first', 'second']);
  });

  it('says what the engine refuses as the engine says it', async () => {
    const { worker, requests, reply } = fakeWorker();
    const asked = workerEngine(worker).run('analyse', question);
    reply({ id: requests[0].id, refused: { pointer: '/plant', code: 'zeroPlant', detail: 'The plant is 0.' } });
    const error = await asked.catch((reason: unknown) => reason);
    expect(error).toBeInstanceOf(LoopError);
    expect(error).toMatchObject({ code: 'zeroPlant', detail: 'The plant is 0.', pointer: '/plant' });
  });

  it('does not pass a defect off as a refusal', async () => {
    const { worker, requests, reply } = fakeWorker();
    const asked = workerEngine(worker).run('analyse', question);
    reply({ id: requests[0].id, defect: 'TypeError: x is not a function' });
    const error = await asked.catch((reason: unknown) => reason);
    expect(error).not.toBeInstanceOf(LoopError);
    expect(String(error)).toContain('x is not a function');
  });

  it('goes on in the page where its script cannot be loaded', async () => {
    const { worker, requests, fail } = fakeWorker();
    const engine = workerEngine(worker);
    const before = engine.run('analyse', question);
    fail();
    expect((await before).closedLoop.stable).toBe(true);
    expect((await engine.run('analyse', question)).margins.phase).not.toBeNull();
    expect(requests).toHaveLength(1);
  });
});
