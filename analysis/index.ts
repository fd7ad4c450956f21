/** The contents page of the engine: what others may use. */
export { analyseLoop, engineVersion, withResponses, type AnalyseOptions } from './analyse-loop';
export { loopAt, type LoopPoint } from './loop-at';
export { buildLoop } from './loop/build-loop';
export { describePlant, type PlantDescription } from './loop/describe-plant';
export { filterPhaseDegrees } from './loop/filter-phase';
export { gainsInForm, type Rewritten, type TimedGains } from './loop/gains-in-form';
export { LoopError, type LoopErrorCode } from './loop/loop-error';
export type { LoopModel, ParallelGains, Rational } from './loop/model';
export { toParallelGains } from './loop/parallel-gains';
export { differenceEquation, type DifferenceEquation } from './sampled/difference-equation';
export type { DigitalFilter } from './sampled/digital-filter';
export { plantResponse, type PlantResponse } from './plant-response';
export type { Complex } from './numbers/complex';
