import type { LoopFunction } from './loop-function';
import { LOG, OMEGA, PHASE, ROW, type Table } from './sample';

/** How fine a grid is to be. */
export interface Fineness {
  /** Largest change of ln|L| between neighbours. */
  readonly logStep: number;
  /** Largest change of the phase without dead time, radians. */
  readonly phaseStep: number;
  /** Largest change of the phase with dead time, radians. */
  readonly turnStep: number;
  /** The same where |L| is below QUIET: L then goes round a small circle, and S with it, smoothly. */
  readonly quietTurnStep: number;
  /** The dead time's turning is followed only where ln|L| is above this. */
  readonly turnFloor: number;
  readonly pointsPerDecade: number;
  /** Most rows; reaching it ends refinement. */
  readonly cap: number;
}

export interface Grid {
  readonly table: Table;
  readonly count: number;
  /** Refinement ended at the cap, coarser than asked. */
  readonly capped: boolean;
}

/** ln|L| below which the turns of dead time need fewer rows. */
const QUIET = Math.log(0.3);
/** An interval is cut into at most this many pieces at once, so that wide intervals are judged again on the way. */
const MOST_PIECES = 8;
/** Neighbours nearer than this, relatively, are not parted further: L jumps there (an undamped pole or zero). */
const CLOSEST = 1e-7;

/**
 * Samples the loop at `frequencies` (ascending) and between them until no two neighbours are further apart than asked.
 * Whole passes over the grid, so that a cap falls evenly.
 */
export const refinedGrid = (loop: LoopFunction, frequencies: readonly number[], fineness: Fineness): Grid => {
  let table: Table = new Float64Array(frequencies.length * ROW);
  frequencies.forEach((omega, i) => loop.sampleAt(omega, table, i * ROW));
  let count = frequencies.length;
  for (;;) {
    const pieces = piecesWanted(table, { count, fineness, deadTime: loop.deadTime });
    const wanted = pieces.reduce((sum, n) => sum + n, 1);
    if (wanted === count) return { table, count, capped: false };
    if (wanted > fineness.cap) return { table, count, capped: true };
    const next: Table = new Float64Array(wanted * ROW);
    let end = 0;
    for (let i = 0; i < count; i += 1) {
      for (let k = 0; k < ROW; k += 1) next[end * ROW + k] = table[i * ROW + k];
      end += 1;
      const n = i < count - 1 ? pieces[i] : 1;
      const from = table[i * ROW + OMEGA];
      const ratio = n > 1 ? (table[(i + 1) * ROW + OMEGA] / from) ** (1 / n) : 1;
      for (let k = 1; k < n; k += 1, end += 1) loop.sampleAt(from * ratio ** k, next, end * ROW);
    }
    table = next;
    count = wanted;
  }
};

/** Into how many pieces each interval is to be cut. */
const piecesWanted = (table: Table, { count, fineness, deadTime }: { count: number; fineness: Fineness; deadTime: number }): Uint8Array => {
  const pieces = new Uint8Array(count - 1);
  for (let i = 0; i < count - 1; i += 1) {
    const row = i * ROW;
    const next = row + ROW;
    const span = table[next + OMEGA] - table[row + OMEGA];
    const turn = Math.abs(table[next + PHASE] - table[row + PHASE]);
    const bend = Math.abs(table[next + PHASE] - table[row + PHASE] + span * deadTime);
    const log = Math.max(table[row + LOG], table[next + LOG]);
    const turnStep = log > QUIET ? fineness.turnStep : fineness.quietTurnStep;
    const excess = Math.max(
      Math.abs(table[next + LOG] - table[row + LOG]) / fineness.logStep,
      bend / fineness.phaseStep,
      log > fineness.turnFloor ? turn / turnStep : 0,
    );
    const done = !(excess > 1) || span <= CLOSEST * table[next + OMEGA];
    pieces[i] = done ? 1 : Math.min(MOST_PIECES, Math.ceil(excess));
  }
  return pieces;
};

/** Ascending frequencies from `low` to `high`: an even logarithmic ladder and every landmark between. */
export const ladder = (
  low: number,
  high: number,
  { pointsPerDecade, landmarks }: { pointsPerDecade: number; landmarks: readonly number[] },
): number[] => {
  const steps = Math.max(1, Math.ceil(Math.log10(high / low) * pointsPerDecade));
  const even = Array.from({ length: steps + 1 }, (_, k) => low * (high / low) ** (k / steps));
  const all = [...even, ...landmarks.filter((omega) => omega > low && omega < high)];
  return [...new Set(all)].sort((a, b) => a - b);
};
