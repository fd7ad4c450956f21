import type { MessagePort } from 'node:worker_threads';
import type { Loop, PlantModel, ProblemError } from '@/contract';

/** What crosses to a worker thread. `started` hears when the engine begins, so that waiting in the queue is not counted. */
interface Watched {
  readonly started: MessagePort;
}
export interface AnalyseTask extends Watched {
  readonly loop: Loop;
  readonly curves: boolean;
}
export interface DescribeTask extends Watched {
  readonly plant: PlantModel;
}

/** What comes back: classes do not survive the passage between threads, so a refusal travels as data. */
export type Outcome<Value> = { readonly value: Value } | { readonly refused: ProblemError };
