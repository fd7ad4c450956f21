import type { MessagePort } from 'node:worker_threads';
import type { RoomQuestion, WayName } from '@/analysis/project';
import type { Loop, PlantModel, ProblemError } from '@/contract';

/** What crosses to a worker thread. `started` hears which loop the engine begins, so that waiting in the queue is not counted. */
interface Watched {
  readonly started: MessagePort;
}
export interface AnalyseTask extends Watched {
  readonly loop: Loop;
  readonly curves: boolean;
}
/** Several loops in one passage between threads, without curves. */
export interface AnalyseAllTask extends Watched {
  readonly loops: readonly Loop[];
  readonly responses: boolean;
}
export interface DescribeTask extends Watched {
  readonly plant: PlantModel;
}
export interface RoomTask extends Watched {
  readonly way: WayName;
  readonly question: RoomQuestion;
  readonly reach: number;
}

/** What comes back: classes do not survive the passage between threads, so a refusal travels as data. */
export type Outcome<Value> = { readonly value: Value } | { readonly refused: ProblemError };
