/** Values within `band` of `centre`. */
export interface Band {
  readonly centre: number;
  readonly band: number;
}

/** Settled is what stays within this share of the final value, or of the peak where that is what it is measured by. */
const SETTLING_BAND = 0.02;

/** A final value below this share of the peak is 0 but for rounding. */
const NEGLIGIBLE = 1e-9;

/** ±2 % of the final value; of the peak where the final value is 0 or there is none. */
export function referenceBand(finalValue: number | null, peak: number): Band {
  const final = finalValue ?? 0;
  const vanishes = Math.abs(final) <= NEGLIGIBLE * peak;
  return { centre: vanishes ? 0 : final, band: SETTLING_BAND * (vanishes ? peak : Math.abs(final)) };
}

/** ±2 % of the peak about where the load response ends. */
export function loadBand(finalValue: number | null, peak: number): Band {
  return { centre: finalValue ?? 0, band: SETTLING_BAND * peak };
}
