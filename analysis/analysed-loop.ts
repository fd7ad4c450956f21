import type { Margins, Responses, TimeResponse, Warning } from '@/contract';
import type { LoopFunction } from '@/analysis/margins/loop-function';
import type { LoopNumbers } from '@/analysis/margins/loop-numbers';
import type { Crossings, Stability } from '@/analysis/margins/stability';
import type { TimeResponseOptions } from '@/analysis/time';

/** What else was found when the warnings are asked for. */
export interface Found {
  readonly stability: Stability;
  /** The drawn grid ended at its cap. */
  readonly capped: boolean;
}

/** A loop as an analysis asks it: all that differs between continuous time and a computer's. */
export interface AnalysedLoop {
  readonly loop: LoopFunction;
  judge(crossings: Crossings): Stability;
  delayMargin(numbers: LoopNumbers, stability: Stability): Margins['delay'];
  warnings(found: Found): Warning[];
  respond(
    responses: Responses,
    stability: Pick<Stability, 'stable' | 'poles'>,
    options: TimeResponseOptions,
  ): { timeResponse: TimeResponse | null; warnings: Warning[] };
}
