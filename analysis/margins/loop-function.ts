import type { Asymptote } from '@/analysis/loop/axis-product';
import type { Table } from './sample';

/**
 * A loop as this folder sees it: a function of ω that can be sampled anywhere on its axis. A continuous loop's axis has no
 * end, a sampled loop's ends at π/h. Nothing here knows where the samples come from.
 */
export interface LoopFunction {
  /** Writes one row at `offset`. Counts against the loop's budget. */
  sampleAt(omega: number, table: Table, offset: number): void;
  /** Frequencies near which something happens: corners, resonances, 1/dead time. Ascending, positive. */
  readonly landmarks: readonly number[];
  /** Frequencies of undamped poles and zeros: L has no value there and its phase jumps. */
  readonly axisFrequencies: readonly number[];
  /** L ≡ 0: nothing is fed back. */
  readonly isZero: boolean;
  /** Dead time that turns the phase without end; 0 where the axis is finite or there is none. */
  readonly deadTime: number;
  /** Where the axis ends, L real there: π/h of a sampled loop. null: nowhere, as ω → ∞. */
  readonly end: number | null;
  /** Phase crossovers where |L| is less are not listed. */
  readonly leastListedGain: number;
  readonly atZero: EndOfAxis;
  readonly atInfinity: EndOfAxis;
}

/** What L, K·C_y and P·K·(C_r + F) tend to at an end of the axis; dead time aside. */
export interface EndOfAxis {
  readonly loop: Asymptote;
  readonly command: Asymptote;
  readonly reference: Asymptote;
}
