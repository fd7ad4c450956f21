import type { StepSizes } from '../live/bench-loop';
import { type ChartSheet, isChartSheet } from '../sheets/chart-sheet';

export type Parameter = 'design' | 'revision' | 'analysis' | 'case' | 'chart' | 'b' | 'step' | 'load';
export type Parameters = Partial<Record<Parameter, string>>;
/** Changes the address; what is set to undefined leaves it. */
export type ChangeLink = (change: Parameters) => void;

/** What can be shared of a bench, as its address has it. */
export interface BenchLink {
  readonly design?: string;
  readonly revision?: number;
  readonly analysis?: string;
  readonly caseId?: string;
  readonly chart: ChartSheet;
  /** The kept revision laid beside; "none" where it was taken away, undefined where nobody chose. */
  readonly compare?: number | 'none';
  readonly steps: StepSizes;
}

const LARGEST_STEP = 1e12;

function step(text: string | undefined): number {
  const size = Number(text);
  return text !== undefined && text !== '' && Number.isFinite(size) && Math.abs(size) <= LARGEST_STEP ? size : 1;
}

function revision(text: string | undefined): number | undefined {
  const number = Number(text);
  return Number.isInteger(number) && number >= 1 ? number : undefined;
}

/** Reads an address; what it does not say, or says wrongly, is what the bench shows by itself. */
export function benchLink(parameters: Parameters): BenchLink {
  return {
    design: parameters.design,
    revision: revision(parameters.revision),
    analysis: parameters.analysis,
    caseId: parameters.case,
    chart: isChartSheet(parameters.chart) ? parameters.chart : 'bode',
    compare: parameters.b === 'none' ? 'none' : revision(parameters.b),
    steps: { reference: step(parameters.step), load: step(parameters.load) },
  };
}
