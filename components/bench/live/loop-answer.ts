import { buildLoop, loopAt, LoopError } from '@/analysis';
import type { LoopPoint } from '@/components/charts/chart-types';
import type { Analysis, Loop } from '@/contract';

/** One loop's analysis, and the loop itself at any frequency. */
export interface LoopAnswer {
  readonly loop: Loop;
  readonly analysis: Analysis;
  readonly at: (frequency: number) => LoopPoint;
}

/** Joins what the engine said of a loop with the loop itself, which is prepared when someone first asks for a point of it. */
export function loopAnswer(loop: Loop, analysis: Analysis): LoopAnswer {
  let prepared: LoopAnswer['at'] | null = null;
  return { loop, analysis, at: (frequency) => (prepared ??= loopAt(buildLoop(loop)))(frequency) };
}

/** What the engine says of a loop that has no meaning; anything else is a defect and is thrown on. */
export function explainLoopError(error: unknown): string {
  if (error instanceof LoopError) return error.detail;
  throw error;
}
