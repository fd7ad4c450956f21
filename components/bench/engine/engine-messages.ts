import type { LoopError } from '@/analysis';
import type { TaskInput, TaskName, TaskOutput } from './engine-tasks';

/** What the page sends its worker. */
export interface EngineRequest<Name extends TaskName = TaskName> {
  readonly id: number;
  readonly name: Name;
  readonly input: TaskInput<Name>;
}

/** What a LoopError says; the error itself cannot be sent. */
export type Refusal = Pick<LoopError, 'pointer' | 'detail' | 'code'>;

/** What comes back: what the task gave, what the engine refuses, or the text of a defect. */
export type EngineReply =
  | { readonly id: number; readonly output: TaskOutput<TaskName> }
  | { readonly id: number; readonly refused: Refusal }
  | { readonly id: number; readonly defect: string };
