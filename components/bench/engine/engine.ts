import type { TaskInput, TaskName, TaskOutput } from './engine-tasks';

/** The engine as the page asks it: one task after the other, answered when it is done. */
export interface Engine {
  /** Rejects with a LoopError where the loop has no meaning; anything else is a defect. */
  run<Name extends TaskName>(name: Name, input: TaskInput<Name>): Promise<TaskOutput<Name>>;
}
