import type { Loop } from '@/contract';
import type { LoopModel } from '@/analysis/loop/model';
import { ContinuousLoop } from '@/analysis/margins/continuous-loop';
import { loopWarnings } from '@/analysis/margins/loop-warnings';
import { refuseSingular } from '@/analysis/margins/refuse-singular';
import { judgeStability } from '@/analysis/margins/stability';
import { timeResponse } from '@/analysis/time';
import type { AnalysedLoop } from './analysed-loop';

/** A loop in continuous time. @throws LoopError where it has no solution */
export const analysedContinuous = (input: Loop, model: LoopModel): AnalysedLoop => {
  const loop = new ContinuousLoop(model);
  refuseSingular(loop);
  return {
    loop,
    judge: (crossings) => judgeStability(model, loop, crossings),
    delayMargin: ({ margins }) => margins.delay,
    warnings: (found) => loopWarnings(input, loop, found),
    respond: (responses, { stable, poles }, options) => timeResponse(model, responses, { stable, closedLoopPoles: poles }, options),
  };
};
