import type { Analysis, Loop, TimeResponse } from '@/contract';
import { exactValues } from '@/analysis/margins/exact-values';
import { buildLoop } from '@/analysis/loop/build-loop';
import { drawnGrid, frequencyResponse } from '@/analysis/margins/frequency-response';
import { loopNumbers } from '@/analysis/margins/loop-numbers';
import type { Detail } from '@/analysis/margins/search-grid';
import { analysedContinuous } from './analysed-continuous';
import type { AnalysedLoop } from './analysed-loop';
import { analysedSampled } from './analysed-sampled';

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
  const analysed = analysedLoop(input);
  const { loop } = analysed;
  const numbers = loopNumbers(loop, detail);
  const { margins, sensitivity, bandwidth, crossovers, startsOutside } = numbers;
  const stability = analysed.judge({ crossovers, startsOutside, modulus: margins.modulus });
  const grid = curves ? drawnGrid(loop, { crossovers, detail }) : null;
  const { stable, unstablePoles, encirclements, encirclementsNeeded, poles } = stability;
  const points = curves && detail === 'full' ? {} : { points: FEW_POINTS };
  const times = responses ? analysed.respond(input.responses, stability, points) : NO_RESPONSES;
  return {
    engineVersion,
    closedLoop: { stable, unstablePoles, encirclements, encirclementsNeeded, poles: poles && [...poles] },
    margins: { ...margins, delay: analysed.delayMargin(numbers, stability) },
    sensitivity,
    bandwidth,
    ...(grid ? { frequencyResponse: frequencyResponse(grid) } : {}),
    at: exactValues(loop, input.at),
    timeResponse: curves ? times.timeResponse : withoutSeries(times.timeResponse),
    warnings: [...analysed.warnings({ stability, capped: grid?.capped ?? false }), ...times.warnings],
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
  const times = analysedLoop(input).respond(input.responses, { stable, poles }, points);
  const others = analysis.warnings.filter(({ code }) => times.warnings.every((warning) => warning.code !== code));
  return { ...analysis, timeResponse: times.timeResponse, warnings: [...others, ...times.warnings] };
};

const analysedLoop = (input: Loop): AnalysedLoop => {
  const model = buildLoop(input);
  return model.sampled ? analysedSampled(input, model, model.sampled) : analysedContinuous(input, model);
};
