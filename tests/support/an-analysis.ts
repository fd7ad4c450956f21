import type { Analysis, CaseResult, TimeMetrics } from '@/contract';

const noMetrics: TimeMetrics = {
  finalValue: null,
  riseTime: null,
  settlingTime: null,
  overshootPercent: null,
  undershootPercent: null,
  peakTime: null,
  steadyStateError: null,
  iae: null,
  itae: null,
  controlTotalVariation: null,
  controlPeak: null,
  timeAtLimits: null,
  loadPeak: null,
  loadPeakTime: null,
  loadSettlingTime: null,
  loadIae: null,
};

interface Parts {
  readonly stable?: boolean;
  readonly unstablePoles?: number;
  readonly margins?: Partial<Analysis['margins']>;
  readonly ms?: number;
  readonly metrics?: Partial<TimeMetrics>;
}

/** An analysis with the numbers of the request in api.md, and what a test says otherwise. */
export function anAnalysis({ stable = true, unstablePoles = stable ? 0 : 2, margins, ms = 1.5598, metrics }: Parts = {}): Analysis {
  return {
    engineVersion: '1.0.0',
    closedLoop: { stable, unstablePoles, encirclements: unstablePoles, encirclementsNeeded: 0, poles: null },
    margins: {
      gain: { factor: 11.681, decibels: 21.35, frequency: 10.865 },
      gainReduction: null,
      phase: { degrees: 45.319, frequency: 2.059 },
      delay: { seconds: 0.38416, frequency: 2.059 },
      disk: { alpha: 0.8016, gainLow: 0.42776, gainHigh: 2.3378, phaseDegrees: 43.682 },
      modulus: 1 / ms,
      gainCrossovers: [{ frequency: 2.059, phaseMarginDegrees: 45.319 }],
      phaseCrossovers: [{ frequency: 10.865, gainMarginFactor: 11.681 }],
      ...margins,
    },
    sensitivity: {
      ms: { value: ms, decibels: 20 * Math.log10(ms), frequency: 2.9194 },
      mt: { value: 1.3239, decibels: 2.4369, frequency: 1.7669 },
      noiseGain: { value: 6.2, frequency: null },
    },
    bandwidth: { closedLoop: 3.5172, reference: 3.4554, sensitivity: 1.2896 },
    at: [],
    timeResponse: { metrics: stable ? { ...noMetrics, ...metrics } : null },
    warnings: [],
  };
}

/** A judged case named so, with no checks unless a test gives them. */
export function aResult(name: string, numbers: Analysis, judged: Partial<CaseResult> = {}): CaseResult {
  const id = `00000000-0000-4000-8000-${name.length.toString().padStart(12, '0')}`;
  return { case: { id, name }, verdict: 'notJudged', reason: 'No limits are set.', checks: [], numbers, ...judged };
}
