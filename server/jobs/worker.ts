import { analyseLoop, LoopError } from '@/analysis';
import { describeFormula, resolveFormula } from '@/analysis/formula';
import { roomAlong, type FoundRoom } from '@/analysis/project';
import type { Analysis, PlantReading } from '@/contract';
import type { AnalyseAllTask, AnalyseTask, DescribeTask, Outcome, RoomTask } from './task';

/** The entry of every worker thread: the only place of the server where the engine runs. */

function outcomeOf<Value>(compute: () => Value): Outcome<Value> {
  try {
    return { value: compute() };
  } catch (error) {
    if (error instanceof LoopError) return { refused: { pointer: error.pointer, detail: error.detail } };
    throw error;
  }
}

export function analyse({ loop, curves, started }: AnalyseTask): Outcome<Analysis> {
  started.postMessage(0);
  return outcomeOf(() => analyseLoop(resolveFormula(loop), { curves }));
}

/** Each loop by itself, so that a refusal says which one it is. */
export function analyseAll({ loops, responses, started }: AnalyseAllTask): Outcome<Outcome<Analysis>[]> {
  return {
    value: loops.map((loop, index) => {
      started.postMessage(index);
      return outcomeOf(() => analyseLoop(resolveFormula(loop), { curves: false, responses }));
    }),
  };
}

export function describe({ plant, started }: DescribeTask): Outcome<PlantReading> {
  started.postMessage(0);
  return outcomeOf(() => describeFormula(plant));
}

export function room({ way, question, reach, started }: RoomTask): Outcome<FoundRoom> {
  return outcomeOf(() => roomAlong(way, question, { reach, asked: () => started.postMessage(0) }));
}
