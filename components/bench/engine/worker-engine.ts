import { LoopError } from '@/analysis';
import type { Engine } from './engine';
import type { EngineReply, EngineRequest } from './engine-messages';
import { pageEngine } from './page-engine';

interface Waiting {
  readonly request: EngineRequest;
  resolve(output: unknown): void;
  reject(error: unknown): void;
}

/** The part of a Worker that an engine needs. */
export type EngineWorker = Pick<Worker, 'postMessage' | 'onmessage' | 'onerror'>;

/** The engine in a worker. Where the worker's script cannot be loaded, the page does the tasks itself. */
export function workerEngine(worker: EngineWorker): Engine {
  const waiting = new Map<number, Waiting>();
  let count = 0;
  let failed = false;

  const settle = (reply: EngineReply) => {
    const asked = waiting.get(reply.id);
    waiting.delete(reply.id);
    if ('output' in reply) asked?.resolve(reply.output);
    else if ('refused' in reply) asked?.reject(new LoopError(reply.refused));
    else asked?.reject(new Error(reply.defect));
  };
  worker.onmessage = ({ data }: MessageEvent<EngineReply>) => settle(data);
  worker.onerror = () => {
    failed = true;
    for (const { request, resolve, reject } of waiting.values()) pageEngine.run(request.name, request.input).then(resolve, reject);
    waiting.clear();
  };
  return {
    run(name, input) {
      if (failed) return pageEngine.run(name, input);
      return new Promise((resolve, reject) => {
        const request = { id: (count += 1), name, input };
        waiting.set(request.id, { request, resolve: resolve as Waiting['resolve'], reject });
        worker.postMessage(request);
      });
    },
  };
}
