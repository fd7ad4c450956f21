import * as S from './sample';

/**
 * A real function of frequency by its place in a row of readings: its natural logarithm (or, for a phase, its value) stands
 * there, and its derivative to ln ω right after.
 */
export type Quantity = number;

/** From a quantity's place to its slope's. */
export const SLOPE = 1;

export const loopGain: Quantity = 0;
export const loopPhase: Quantity = 2;
export const sensitivity: Quantity = 4;
export const complementarySensitivity: Quantity = 6;
/** |(S − T)/2|. */
export const balancedSensitivity: Quantity = 8;
/** |K·C_y·S|. */
export const noiseSensitivity: Quantity = 10;
export const referenceResponse: Quantity = 12;
export const READINGS = 14;

/**
 * Reads every quantity off the sample at `row` of a table into `readings` from `place` on.
 *
 * With λ = d ln L/d ln ω: ln|1 + L| has the slope Re(λ·T), ln|T| has Re(λ·S), which does not cancel where T is near 1, and
 * ln|(S − T)/2| = ln|1 − L|/(2·|1 + L|) has −2·Re(λ·L/(1 − L²)).
 *
 * @see REFERENCES "Slopes of the peaks", Seiler 2020
 */
export const readQuantities = (table: S.Table, row: number, readings: Float64Array, place: number): void => {
  const re = table[row + S.RE];
  const im = table[row + S.IM];
  const log = table[row + S.LOG];
  const logSlope = table[row + S.LOG_SLOPE];
  const phaseSlope = table[row + S.PHASE_SLOPE];
  const square = (1 + re) * (1 + re) + im * im;
  const difference = 0.5 * Math.log(square);
  const differenceSlope = logSlope * ((re * (1 + re) + im * im) / square) - phaseSlope * (im / square);
  // L/(1 − L²) = 1/(1/L − L), with 1/L = (re − j·im)/size.
  const size = re * re + im * im;
  const x = re / size - re;
  const y = -im / size - im;
  readings[place + loopGain] = log;
  readings[place + loopGain + SLOPE] = logSlope;
  readings[place + loopPhase] = table[row + S.PHASE];
  readings[place + loopPhase + SLOPE] = phaseSlope;
  readings[place + sensitivity] = -difference;
  readings[place + sensitivity + SLOPE] = -differenceSlope;
  readings[place + complementarySensitivity] = log - difference;
  readings[place + complementarySensitivity + SLOPE] = (logSlope * (1 + re) + phaseSlope * im) / square;
  readings[place + balancedSensitivity] = 0.5 * Math.log((1 - re) * (1 - re) + im * im) - Math.LN2 - difference;
  readings[place + balancedSensitivity + SLOPE] = (-2 * (logSlope * x + phaseSlope * y)) / (x * x + y * y);
  readings[place + noiseSensitivity] = table[row + S.COMMAND_LOG] - difference;
  readings[place + noiseSensitivity + SLOPE] = table[row + S.COMMAND_LOG_SLOPE] - differenceSlope;
  readings[place + referenceResponse] = table[row + S.REFERENCE_LOG] - difference;
  readings[place + referenceResponse + SLOPE] = table[row + S.REFERENCE_LOG_SLOPE] - differenceSlope;
};
