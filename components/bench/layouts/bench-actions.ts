import type { Gain } from '../draft/gain';
import type { KeepOutcome } from '../keep/keep-outcome';
import type { Standing } from '../live/use-standing';
import type { ChartSheet } from '../sheets/chart-sheet';
import type { BenchLink } from '../subject/bench-link';

/** What the dock and the shelf can do besides moving gains. */
export interface BenchActions {
  readonly activeGain: Gain;
  onActiveGain(gain: Gain): void;
  onSettings(): void;
  readonly outcome: KeepOutcome;
  onKeep(): void;
}

/** What every layout of the bench is given. */
export interface BenchLayoutProps extends BenchActions {
  readonly link: BenchLink;
  readonly standing: Standing;
  onChart(sheet: ChartSheet): void;
  onCase(caseId: string): void;
  /** To the newest revision, whatever the address named. */
  onFollow(): void;
}
