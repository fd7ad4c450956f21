import type { Analysis, FrequencyResponse } from '@/contract';

/** Exact values of a loop at one frequency, as `loopAt(model, frequency)` of the engine gives them. Magnitudes are factors. */
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

export interface ChartUnits {
  frequency: 'rad/s' | 'Hz';
  magnitude: 'dB' | 'factor';
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

/** What every chart of a loop takes: A, perhaps B, thin curves of other cases, the limits and the reader's units. */
export interface LoopChartProps {
  a: ChartDesign;
  b?: ChartDesign;
  others?: readonly FrequencyResponse[];
  limits?: ChartLimits;
  units: ChartUnits;
}

export type FrequencyPanel = 'magnitude' | 'phase' | 'sensitivity';

/** One panel of a time sheet; its title says what is shown after what ("Speed after a 1 m/s step"). */
export interface TimePanel {
  kind: 'reference' | 'load' | 'control';
  title: string;
  unit: string;
  height?: number;
}
