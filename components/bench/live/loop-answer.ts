import { analyseLoop, buildLoop, loopAt, LoopError } from '@/analysis';
import type { LoopPoint } from '@/components/charts/chart-types';
import type { Analysis, Loop } from '@/contract';
import type { Detail } from './live-analyser';

/** One loop's analysis, and the loop itself at any frequency. */
export interface LoopAnswer {
  readonly analysis: Analysis;
  readonly at: (frequency: number) => LoopPoint;
}

export function answerLoop(loop: Loop, detail: Detail): LoopAnswer {
  const analysis = analyseLoop(loop, { curves: true, detail });
  const model = buildLoop(loop);
  return { analysis, at: loopAt(model) };
}

/** What the engine says of a loop that has no meaning; anything else is a defect and is thrown on. */
export function explainLoopError(error: unknown): string {
  if (error instanceof LoopError) return error.detail;
  throw error;
}
