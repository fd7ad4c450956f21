import { LoopError } from '@/analysis';
import type { EngineReply, EngineRequest } from './engine-messages';
import { doTask } from './engine-tasks';

/** Runs in a worker of its own: does one task after the other. */
function reply({ id, name, input }: EngineRequest): EngineReply {
  try {
    return { id, output: doTask(name, input) };
  } catch (error) {
    if (error instanceof LoopError) return { id, refused: { pointer: error.pointer, detail: error.detail, code: error.code } };
    return { id, defect: error instanceof Error ? (error.stack ?? error.message) : String(error) };
  }
}

self.onmessage = ({ data }: MessageEvent<EngineRequest>) => self.postMessage(reply(data));
