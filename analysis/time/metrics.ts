import type { TimeMetrics } from '@/contract';
import { absoluteIntegrals } from './absolute-integrals';
import type { Curve } from './curve';
import { monotoneKnots, type Knots } from './knots';
import { extreme, firstPassage, lastOutside, peakOf } from './passages';
import { loadBand, referenceBand } from './settling';

/** A response to a unit step: its curves, how far they are known and shown, and where the output ends (null: nowhere). */
export interface StepResponse {
  readonly output: Curve;
  readonly control: Curve;
  /** Of the output, up to the horizon. */
  readonly knots: Knots;
  readonly horizon: number;
  readonly axisEnd: number;
  readonly finalValue: number | null;
}

type ReferenceMetrics = Omit<TimeMetrics, keyof LoadMetrics>;
type LoadMetrics = Pick<TimeMetrics, 'loadPeak' | 'loadPeakTime' | 'loadSettlingTime' | 'loadIae'>;

const RISE_FROM = 0.1;
const RISE_TO = 0.9;

/** An excursion below this share of the final value is the error of the polynomials. */
const NO_EXCURSION = 1e-8;

/** Metrics of the response to a reference step of this size, as numerics.md defines them; times are refined between samples. */
export function referenceMetrics({ output, control, knots, horizon, axisEnd, finalValue }: StepResponse, size: number): ReferenceMetrics {
  const commands = monotoneKnots(control, horizon);
  const error = absoluteIntegrals(output, 1, axisEnd);
  const present = size !== 0;
  const scale = Math.abs(size);
  const { centre, band } = referenceBand(finalValue, peakOf(knots));
  const ends = present && finalValue !== null && centre !== 0;
  const swing = ends ? swings(knots, centre) : { overshootPercent: null, undershootPercent: null, peakTime: null };
  return {
    finalValue: finalValue === null ? null : finalValue * size,
    riseTime: ends ? riseTime(output, knots, centre) : null,
    settlingTime: ends ? lastOutside(output, knots, { centre, band }) : null,
    ...swing,
    steadyStateError: finalValue === null ? null : (1 - finalValue) * size,
    iae: error.plain * scale,
    itae: error.timeWeighted * scale,
    controlTotalVariation: totalVariation(commands) * scale,
    controlPeak: peakOf(commands) * scale,
    timeAtLimits: 0,
  };
}

/** Metrics of the response to a load step of this size. */
export function loadMetrics({ output, knots, axisEnd }: StepResponse, size: number): LoadMetrics {
  const peak = peakOf(knots);
  const top = Math.abs(extreme(knots, 1).value) === peak ? extreme(knots, 1) : extreme(knots, -1);
  const answers = size !== 0 && peak > 0;
  return {
    loadPeak: peak * Math.abs(size),
    loadPeakTime: answers ? top.time : null,
    loadSettlingTime: answers ? lastOutside(output, knots, loadBand(0, peak)) : null,
    loadIae: absoluteIntegrals(output, 0, axisEnd).plain * Math.abs(size),
  };
}

function riseTime(output: Curve, knots: Knots, final: number): number | null {
  const from = firstPassage(output, knots, RISE_FROM * final);
  const to = firstPassage(output, knots, RISE_TO * final);
  return from === null || to === null ? null : to - from;
}

/** Excursions past the final value and on the other side of the start, in percent of the final value. */
function swings(knots: Knots, final: number): Pick<TimeMetrics, 'overshootPercent' | 'undershootPercent' | 'peakTime'> {
  const direction = Math.sign(final);
  const peak = extreme(knots, direction);
  const low = extreme(knots, -direction);
  const overshoot = excursion(peak.value / final - 1);
  return {
    overshootPercent: 100 * overshoot,
    undershootPercent: 100 * excursion(-low.value / final),
    peakTime: overshoot > 0 ? peak.time : null,
  };
}

const excursion = (share: number): number => (share > NO_EXCURSION ? share : 0);

/** Σ|Δu| from the rest before the step. */
function totalVariation({ values }: Knots): number {
  return values.reduce((sum, value, k) => sum + Math.abs(value - (k === 0 ? 0 : values[k - 1])), 0);
}
