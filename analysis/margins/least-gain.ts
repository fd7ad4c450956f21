/** |L| below this counts as zero. */
export const ZERO_GAIN = 1e-12;
/** Below this gain a dead time's crossovers are not listed, numerics.md "Margins". */
export const LEAST_LISTED_GAIN = 1e-3;
