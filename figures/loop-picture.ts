import type { Analysis, FrequencyResponse } from '@/contract';
import type { ReaderUnits } from './quantity-text';

/** Exact values of a loop at one frequency, as `loopAt(model)(frequency)` of the engine gives them. Magnitudes are factors. */
export interface LoopPoint {
  re: number;
  im: number;
  magnitude: number;
  phaseDegrees: number;
  sensitivity: number;
  complementarySensitivity: number;
}

/** One design laid on the charts. `label` names it in keys and tables ("A, now"); `at` takes rad/s. */
export interface ChartDesign {
  label: string;
  analysis: Analysis;
  at: (frequency: number) => LoopPoint;
}

/** What the project demands, in the contract's units. What is absent is not drawn. */
export interface ChartLimits {
  ms?: number;
  phaseMargin?: number;
  gainMargin?: number;
  overshootPercent?: number;
  settlingTime?: number;
  controlMinimum?: number;
  controlMaximum?: number;
}

/** What every picture of a loop is made from: A, perhaps B, thin curves of other cases, the limits and the reader's units. */
export interface LoopScene {
  a: ChartDesign;
  b?: ChartDesign;
  others?: readonly FrequencyResponse[];
  limits?: ChartLimits;
  units: ReaderUnits;
}

const nothing: FrequencyResponse = {
  frequencies: [],
  loop: { magnitude: [], phaseDegrees: [], real: [], imaginary: [] },
  plant: { magnitude: [], phaseDegrees: [] },
  controller: { magnitude: [], phaseDegrees: [] },
  sensitivity: [],
  complementarySensitivity: [],
  loadSensitivity: [],
  noiseSensitivity: [],
};

/** The curves of a design, or empty ones where the analysis was asked for without. */
export const responseOf = ({ analysis }: Pick<ChartDesign, 'analysis'>): FrequencyResponse => analysis.frequencyResponse ?? nothing;
