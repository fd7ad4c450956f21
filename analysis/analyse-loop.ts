import type { Analysis, Loop, TimeResponse } from '@/contract';
import { buildLoop } from '@/analysis/loop/build-loop';
import { ContinuousLoop } from '@/analysis/margins/continuous-loop';
import { exactValues } from '@/analysis/margins/exact-values';
import { drawnGrid, frequencyResponse } from '@/analysis/margins/frequency-response';
import { loopNumbers } from '@/analysis/margins/loop-numbers';
import { loopWarnings } from '@/analysis/margins/loop-warnings';
import { refuseSingular } from '@/analysis/margins/refuse-singular';
import type { Detail } from '@/analysis/margins/search-grid';
import { judgeStability } from '@/analysis/margins/stability';
import { timeResponse } from '@/analysis/time';

/** Changes whenever a number of an analysis can change. */
export const engineVersion = '1.0.0';

/** Points of a time response that nobody looks at closely: a gain is moving, or only the metrics are asked for. */
const FEW_POINTS = 240;

const NO_RESPONSES = { timeResponse: null, warnings: [] };

export interface AnalyseOptions {
  /** false: no frequency response and no series. */
  curves?: boolean;
  /** false: no time responses, and nothing said of them. */
  responses?: boolean;
  /** live: coarser grids for a gain that is being moved; the same definitions. */
  detail?: Detail;
}

/**
 * Everything that can be said of one loop; numerics.md defines every number.
 * @throws LoopError where the loop has no meaning, is not supported, or would take too long
 */
export const analyseLoop = (input: Loop, { curves = true, responses = true, detail = 'full' }: AnalyseOptions = {}): Analysis => {
  const model = buildLoop(input);
  const loop = new ContinuousLoop(model);
  refuseSingular(loop);
  const { margins, sensitivity, bandwidth, crossovers, startsOutside } = loopNumbers(loop, detail);
  const stability = judgeStability(model, loop, { crossovers, startsOutside, modulus: margins.modulus });
  const grid = curves ? drawnGrid(loop, { crossovers, detail }) : null;
  const { stable, unstablePoles, encirclements, encirclementsNeeded, poles } = stability;
  const points = curves && detail === 'full' ? {} : { points: FEW_POINTS };
  const times = responses ? timeResponse(model, input.responses, { stable, closedLoopPoles: poles }, points) : NO_RESPONSES;
  return {
    engineVersion,
    closedLoop: { stable, unstablePoles, encirclements, encirclementsNeeded, poles: poles && [...poles] },
    margins,
    sensitivity,
    bandwidth,
    ...(grid ? { frequencyResponse: frequencyResponse(grid) } : {}),
    at: exactValues(loop, input.at),
    timeResponse: curves ? times.timeResponse : withoutSeries(times.timeResponse),
    warnings: [...loopWarnings(input, loop, { stability, capped: grid?.capped ?? false }), ...times.warnings],
  };
};

const withoutSeries = (response: TimeResponse | null): TimeResponse | null => response && { metrics: response.metrics };

/**
 * An analysis of this very loop with its time responses computed anew: those that were left out, or others of another duration.
 * @throws LoopError as `analyseLoop` does
 */
export const withResponses = (analysis: Analysis, input: Loop, detail: Detail = 'full'): Analysis => {
  const { stable, poles } = analysis.closedLoop;
  const points = detail === 'full' ? {} : { points: FEW_POINTS };
  const times = timeResponse(buildLoop(input), input.responses, { stable, closedLoopPoles: poles }, points);
  const others = analysis.warnings.filter(({ code }) => times.warnings.every((warning) => warning.code !== code));
  return { ...analysis, timeResponse: times.timeResponse, warnings: [...others, ...times.warnings] };
};
