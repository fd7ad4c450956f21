import type { LoopFunction } from './loop-function';
import { LOG, OMEGA, PHASE, type Table } from './sample';
import { SampledRows } from './sampled-rows';

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
  /** Where the rows begin in the table, by ascending frequency. */
  readonly rows: readonly number[];
  /** Refinement ended at the cap, coarser than asked. */
  readonly capped: boolean;
}

/** ln|L| below which the turns of dead time need fewer rows. */
const QUIET = Math.log(0.3);
/** An interval is cut into at most this many pieces at once, so that wide intervals are judged again on the way. */
const MOST_PIECES = 8;
/** Rows that most grids come to for each frequency they start from. */
const ROOM_PER_FREQUENCY = 3;
/** Neighbours nearer than this, relatively, are not parted further: L jumps there (an undamped pole or zero). */
const CLOSEST = 1e-7;

/**
 * Samples the loop at `frequencies` (ascending) and between them until no two neighbours are further apart than asked.
 * Whole passes over the grid, so that a cap falls evenly; what one pass left whole the next does not judge again.
 */
export const refinedGrid = (loop: LoopFunction, frequencies: readonly number[], fineness: Fineness): Grid => {
  const rule = { ...fineness, deadTime: loop.deadTime };
  const samples = new SampledRows(loop, ROOM_PER_FREQUENCY * frequencies.length);
  let rows = frequencies.map((omega) => samples.add(omega));
  let pieces = rows.map(() => UNJUDGED);
  pieces[pieces.length - 1] = WHOLE;
  for (;;) {
    const { table } = samples;
    let wanted = rows.length;
    for (let i = 0; i < rows.length; i += 1) {
      if (pieces[i] === UNJUDGED) pieces[i] = piecesWanted(table, rows[i], rows[i + 1], rule);
      wanted += pieces[i] - 1;
    }
    if (wanted === rows.length) return { table, rows, capped: false };
    if (wanted > fineness.cap) return { table, rows, capped: true };
    [rows, pieces] = cut(samples, rows, pieces);
  }
};

/** Marks of the interval that follows a row: not looked at yet, and fine enough. */
const UNJUDGED = 0;
const WHOLE = 1;

/** Samples between rows, evenly in ln ω, so that each interval is in as many pieces as wanted; a piece is not judged yet. */
const cut = (samples: SampledRows, rows: readonly number[], pieces: readonly number[]): [rows: number[], pieces: number[]] => {
  const nextRows: number[] = [];
  const nextPieces: number[] = [];
  for (let i = 0; i < rows.length; i += 1) {
    const count = pieces[i];
    nextRows.push(rows[i]);
    nextPieces.push(count === WHOLE ? WHOLE : UNJUDGED);
    if (count === WHOLE) continue;
    const from = samples.table[rows[i] + OMEGA];
    const step = Math.log(samples.table[rows[i + 1] + OMEGA] / from) / count;
    for (let k = 1; k < count; k += 1) {
      nextRows.push(samples.add(from * Math.exp(k * step)));
      nextPieces.push(UNJUDGED);
    }
  }
  return [nextRows, nextPieces];
};

/** Into how many pieces the interval between two rows is to be cut. */
const piecesWanted = (table: Table, row: number, next: number, rule: Fineness & { readonly deadTime: number }): number => {
  const span = table[next + OMEGA] - table[row + OMEGA];
  const turn = Math.abs(table[next + PHASE] - table[row + PHASE]);
  const bend = Math.abs(table[next + PHASE] - table[row + PHASE] + span * rule.deadTime);
  const log = Math.max(table[row + LOG], table[next + LOG]);
  const turnStep = log > QUIET ? rule.turnStep : rule.quietTurnStep;
  const excess = Math.max(
    Math.abs(table[next + LOG] - table[row + LOG]) / rule.logStep,
    bend / rule.phaseStep,
    log > rule.turnFloor ? turn / turnStep : 0,
  );
  const isWhole = !(excess > 1) || span <= CLOSEST * table[next + OMEGA];
  return isWhole ? WHOLE : Math.min(MOST_PIECES, Math.ceil(excess));
};
