/** One row of a table of samples: everything known about the loop at one frequency. Logarithms are natural, phases radians. */
export const OMEGA = 0;
export const RE = 1;
export const IM = 2;
export const MAGNITUDE = 3;
/** ln|L|, and its derivative to ln ω. */
export const LOG = 4;
export const LOG_SLOPE = 5;
/** Unwrapped argument of L, and its derivative to ln ω. */
export const PHASE = 6;
export const PHASE_SLOPE = 7;
/** The plant with its dead time. */
export const PLANT_MAGNITUDE = 8;
export const PLANT_PHASE = 9;
/** Filters and feedback controller, K·C_y. */
export const COMMAND_MAGNITUDE = 10;
export const COMMAND_PHASE = 11;
export const COMMAND_LOG = 12;
export const COMMAND_LOG_SLOPE = 13;
/** P·K·(C_r + F): the reference response is this times S. */
export const REFERENCE_LOG = 14;
export const REFERENCE_LOG_SLOPE = 15;
export const ROW = 16;

/** Rows one after another, each at `index * ROW`. */
export type Table = Float64Array;
