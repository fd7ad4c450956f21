import { analyseLoop, buildLoop, loopAt, LoopError, withResponses } from '@/analysis';
import type { LoopPoint } from '@/components/charts/chart-types';
import type { Analysis, Loop } from '@/contract';
import type { Detail } from './live-analyser';

/** One loop's analysis, and the loop itself at any frequency. */
export interface LoopAnswer {
  readonly loop: Loop;
  readonly analysis: Analysis;
  readonly at: (frequency: number) => LoopPoint;
}

interface Beginning {
  /** The outline of the same loop, where it is known. */
  readonly outline?: LoopAnswer | null;
  /** How long the coarse responses of a stable loop last, s; null: as long as the engine chooses. */
  readonly end?: number | null;
}

/** What the engine says of a loop: an outline without time responses, the same with coarse ones, or all in full. */
export function answerLoop(loop: Loop, detail: Detail, { outline = null, end = null }: Beginning = {}): LoopAnswer {
  if (detail === 'live') {
    const begun = outline ?? answerLoop(loop, 'outline');
    const { stable } = begun.analysis.closedLoop;
    return { ...begun, analysis: withResponses(begun.analysis, stable ? lasting(loop, end) : loop, 'live') };
  }
  const analysis = detail === 'full' ? analyseLoop(loop) : analyseLoop(loop, { responses: false, detail: 'live' });
  return { loop, analysis, at: loopAt(buildLoop(loop)) };
}

/** The same answer with responses that last until `end` s. An unstable loop is shown as long as it takes to grow, whatever is asked. */
export function answerUntil(answer: LoopAnswer, end: number): LoopAnswer {
  if (!answer.analysis.closedLoop.stable) return answer;
  return { ...answer, analysis: withResponses(answer.analysis, lasting(answer.loop, end)) };
}

const lasting = (loop: Loop, duration: number | null): Loop => ({ ...loop, responses: { ...loop.responses, duration } });

/** What the engine says of a loop that has no meaning; anything else is a defect and is thrown on. */
export function explainLoopError(error: unknown): string {
  if (error instanceof LoopError) return error.detail;
  throw error;
}
