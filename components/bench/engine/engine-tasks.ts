import { analyseLoop, withResponses } from '@/analysis';
import type { Analysis, Loop } from '@/contract';
import { judge, lookAlong, marks } from './case-tasks';

/** outline: coarse curves over frequency alone; live: coarse responses alone; full: what is kept. All have every number over frequency. */
export type Detail = 'outline' | 'live' | 'full';

export interface LoopQuestion {
  readonly loop: Loop;
  readonly detail: Detail;
  /** How long the coarse responses of a stable loop last, s; null: as long as the engine chooses. */
  readonly end: number | null;
}

export interface LongerResponses {
  readonly loop: Loop;
  readonly analysis: Analysis;
  /** s */
  readonly end: number;
}

const lasting = (loop: Loop, duration: number | null): Loop => ({ ...loop, responses: { ...loop.responses, duration } });

function analyse({ loop, detail, end }: LoopQuestion): Analysis {
  if (detail === 'full') return analyseLoop(loop);
  if (detail === 'outline') return withDrawnCurves(analyseLoop(loop, { responses: false, detail: 'live' }));
  const numbers = analyseLoop(loop, { responses: false, curves: false, detail: 'live' });
  return withResponses(numbers, numbers.closedLoop.stable ? lasting(loop, end) : loop, 'live');
}

const nothing = { magnitude: [], phaseDegrees: [] };

/** While a gain moves, only the curves that are drawn are worth sending. */
function withDrawnCurves(analysis: Analysis): Analysis {
  const { frequencyResponse } = analysis;
  if (frequencyResponse === undefined) return analysis;
  const left = { plant: nothing, controller: nothing, loadSensitivity: [], noiseSensitivity: [] };
  return { ...analysis, frequencyResponse: { ...frequencyResponse, ...left } };
}

/** The same analysis with responses that last until `end`. An unstable loop is shown as long as it takes to grow, whatever is asked. */
function lengthen({ loop, analysis, end }: LongerResponses): Analysis {
  return analysis.closedLoop.stable ? withResponses(analysis, lasting(loop, end)) : analysis;
}

/** All that is asked of the engine beside the page: from plain data to plain data, so that it can be done in a worker. */
export const engineTasks = { analyse, lengthen, judge, lookAlong, marks };

export type EngineTasks = typeof engineTasks;
export type TaskName = keyof EngineTasks;
export type TaskInput<Name extends TaskName> = Parameters<EngineTasks[Name]>[0];
export type TaskOutput<Name extends TaskName> = ReturnType<EngineTasks[Name]>;

/** Does a task by its name. */
export const doTask = <Name extends TaskName>(name: Name, input: TaskInput<Name>): TaskOutput<Name> =>
  (engineTasks[name] as (input: TaskInput<Name>) => TaskOutput<Name>)(input);
