import type { Loop } from '@/contract';
import type { LoopModel, SampledRun } from '@/analysis/loop/model';
import { exactDelayMargin } from '@/analysis/sampled/delay-margin';
import { refuseImmediate } from '@/analysis/sampled/refuse-immediate';
import { SampledLoop } from '@/analysis/sampled/sampled-loop';
import { sampledModel } from '@/analysis/sampled/sampled-model';
import { sampledTime } from '@/analysis/sampled/sampled-time';
import { judgeSampled } from '@/analysis/sampled/sampled-stability';
import { sampledWarnings } from '@/analysis/sampled/sampled-warnings';
import type { AnalysedLoop } from './analysed-loop';

/** A loop as a computer runs it. @throws LoopError where it has no meaning at this sample period, or no solution */
export const analysedSampled = (input: Loop, model: LoopModel, run: SampledRun): AnalysedLoop => {
  const sampled = sampledModel(model, run);
  refuseImmediate(sampled);
  const loop = new SampledLoop(sampled);
  return {
    loop,
    judge: (crossings) => judgeSampled(sampled, loop, crossings),
    delayMargin: ({ crossovers }, { stable }) => exactDelayMargin(sampled, loop, { crossovers, stable }),
    warnings: (found) => sampledWarnings(input, model, found),
    respond: (responses, { stable }, options) => sampledTime(model, run, { responses, stable, ...options }),
  };
};
