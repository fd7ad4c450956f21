import type { LoopScene, ReaderUnits } from '@/figures';

export type { ChartDesign, ChartLimits, LoopPoint, TimePanel } from '@/figures';

/** The reader's units: rad/s or Hz, dB or factor. */
export type ChartUnits = ReaderUnits;

/** What every chart of a loop takes: A, perhaps B, thin curves of other cases, the limits and the reader's units. */
export type LoopChartProps = LoopScene;

export type FrequencyPanel = 'magnitude' | 'phase' | 'sensitivity';
export type PlaneKind = 'nyquist' | 'nichols';
