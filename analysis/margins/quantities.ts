import * as S from './sample';

/** A real function of frequency, read from one row: its natural logarithm (or, for a phase, its value) and slope to ln ω. */
export interface Quantity {
  value(table: S.Table, row: number): number;
  slope(table: S.Table, row: number): number;
}

const logAbsolute = (re: number, im: number): number => 0.5 * Math.log(re * re + im * im);

/** ln|1 + L|. */
const logDifference = (t: S.Table, row: number): number => logAbsolute(1 + t[row + S.RE], t[row + S.IM]);

/**
 * Re(λ·T) with λ = d ln L/d ln ω: the slope of ln|1 + L|. T is formed from 1/L where L is large, so that nothing overflows.
 */
const differenceSlope = (t: S.Table, row: number): number => {
  const re = t[row + S.RE];
  const im = t[row + S.IM];
  const square = (1 + re) * (1 + re) + im * im;
  const tRe = (re * (1 + re) + im * im) / square;
  const tIm = im / square;
  return t[row + S.LOG_SLOPE] * tRe - t[row + S.PHASE_SLOPE] * tIm;
};

export const loopGain: Quantity = { value: (t, row) => t[row + S.LOG], slope: (t, row) => t[row + S.LOG_SLOPE] };
export const loopPhase: Quantity = { value: (t, row) => t[row + S.PHASE], slope: (t, row) => t[row + S.PHASE_SLOPE] };

export const sensitivity: Quantity = {
  value: (t, row) => -logDifference(t, row),
  slope: (t, row) => -differenceSlope(t, row),
};

/** Its slope is Re(λ·S): no cancellation where T is near 1. */
export const complementarySensitivity: Quantity = {
  value: (t, row) => t[row + S.LOG] - logDifference(t, row),
  slope: (t, row) => {
    const re = 1 + t[row + S.RE];
    const im = t[row + S.IM];
    const square = re * re + im * im;
    return (t[row + S.LOG_SLOPE] * re + t[row + S.PHASE_SLOPE] * im) / square;
  },
};

/** |(S − T)/2| = |1 − L|/(2·|1 + L|), whose slope is −2·Re(λ·L/(1 − L²)). @see REFERENCES Seiler 2020 */
export const balancedSensitivity: Quantity = {
  value: (t, row) => logAbsolute(1 - t[row + S.RE], t[row + S.IM]) - Math.LN2 - logDifference(t, row),
  slope: (t, row) => {
    const re = t[row + S.RE];
    const im = t[row + S.IM];
    const size = re * re + im * im;
    // L/(1 − L²) = 1/(1/L − L), with 1/L = (re − j·im)/size.
    const x = re / size - re;
    const y = -im / size - im;
    return (-2 * (t[row + S.LOG_SLOPE] * x + t[row + S.PHASE_SLOPE] * y)) / (x * x + y * y);
  },
};

export const noiseSensitivity: Quantity = {
  value: (t, row) => t[row + S.COMMAND_LOG] - logDifference(t, row),
  slope: (t, row) => t[row + S.COMMAND_LOG_SLOPE] - differenceSlope(t, row),
};

export const referenceResponse: Quantity = {
  value: (t, row) => t[row + S.REFERENCE_LOG] - logDifference(t, row),
  slope: (t, row) => t[row + S.REFERENCE_LOG_SLOPE] - differenceSlope(t, row),
};
