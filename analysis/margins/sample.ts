/** One row of a table of samples: everything known about the loop at one frequency. Logarithms are natural, phases radians. */
export const OMEGA = 0;
export const RE = 1;
export const IM = 2;
/** ln|L|, and its derivative to ln ω. */
export const LOG = 3;
export const LOG_SLOPE = 4;
/** Unwrapped argument of L, and its derivative to ln ω. */
export const PHASE = 5;
export const PHASE_SLOPE = 6;
/** The plant with its dead time. */
export const PLANT_LOG = 7;
export const PLANT_PHASE = 8;
/** Filters and feedback controller, K·C_y. */
export const COMMAND_LOG = 9;
export const COMMAND_LOG_SLOPE = 10;
export const COMMAND_PHASE = 11;
/** P·K·(C_r + F): the reference response is this times S. */
export const REFERENCE_LOG = 12;
export const REFERENCE_LOG_SLOPE = 13;
export const ROW = 14;

/** Rows one after another, each at `index * ROW`. */
export type Table = Float64Array;
