import { analyseLoop, LoopError } from '@/analysis';
import { describeFormula, resolveFormula } from '@/analysis/formula';
import type { Analysis, PlantReading } from '@/contract';
import type { AnalyseTask, DescribeTask, Outcome } from './task';

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
  started.postMessage(null);
  return outcomeOf(() => analyseLoop(resolveFormula(loop), { curves }));
}

export function describe({ plant, started }: DescribeTask): Outcome<PlantReading> {
  started.postMessage(null);
  return outcomeOf(() => describeFormula(plant));
}
