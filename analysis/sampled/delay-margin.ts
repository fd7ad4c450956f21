import type { Margins } from '@/contract';
import type { GainCrossover } from '@/analysis/margins/crossovers';
import { ladder } from '@/analysis/margins/ladder';
import { wrapped } from '@/analysis/margins/margins';
import { bracketedRoot } from '@/analysis/numbers/bracketed-root';
import { DelayedCircle, type Path } from './delayed-circle';
import { contourAt, gainContour, type ContourPiece, type ContourPoint } from './gain-contour';
import type { SampledLoop } from './sampled-loop';
import type { SampledModel } from './sampled-model';

const TURN = 2 * Math.PI;
/** Rows of the search: so many in each decade, and so many evenly to the end, where magnitudes depend on the delay most. */
const ROWS_PER_DECADE = 12;
const EVEN_ROWS = 16;
/** The search begins this far below what happens first. */
const BELOW = 4;
/** Cells in one period of delay, and as many again for each half turn that the plant swings within a period. */
const COLUMNS = 8;
const MOST_COLUMNS = 96;
/** A delay counts as whole periods, and a pole as there already, within this share of a period. */
const SAME = 1e-9;
/** Turns of the phase after which a piece that never met −1 is left: others have long done so. */
const MOST_TURNS = 64;

/** A delay of more periods than this is no limit: whole periods have no digits left beside it. */
const FARTHEST = 1e9;

interface Hit {
  /** Total delay in periods. */
  readonly delay: number;
  /** null: in a jump. */
  readonly omega: number | null;
}

/**
 * The least extra dead time of the continuous path that puts a closed-loop pole on |z| = 1, and the frequency of that pole.
 *
 * A delay of n whole periods and a rest changes |L| by its rest alone and turns L by ωh for each period. So the curve |L| = 1
 * is followed over frequency and rest, one period of it; on it n = (arg L + π + 2πk)/(ωh) is to be a whole number.
 *
 * A plant that answers at once makes L jump where the delay passes a whole period; a pole that leaves on the way counts there,
 * without a frequency. null where no delay does it, and where an unstable loop's |L| never crosses 1.
 *
 * @see REFERENCES "Exact delay margin"
 */
export const exactDelayMargin = (
  model: SampledModel,
  loop: SampledLoop,
  { crossovers, stable }: { crossovers: readonly GainCrossover[]; stable: boolean },
): Margins['delay'] => {
  if (loop.isZero || (crossovers.length === 0 && !stable)) return null;
  const present = model.delay / model.period;
  const rows = searchRows(loop, crossovers);
  const paths: readonly Path[] = model.held.isImmediate ? ['between', 'jump'] : ['between'];
  let best: Hit | null = null;
  for (const path of paths) {
    const circle = new DelayedCircle(model, path);
    for (const piece of gainContour(circle, rows, columnsFor(model)))
      best = firstHit(circle, piece, { period: model.period, present, best }) ?? best;
  }
  return best && { seconds: Math.max(0, best.delay - present) * model.period, frequency: best.omega };
};

const searchRows = (loop: SampledLoop, crossovers: readonly GainCrossover[]): number[] => {
  const { landmarks, axisFrequencies, end } = loop;
  const first = Math.min(landmarks[0], crossovers[0]?.frequency ?? Infinity);
  const even = Array.from({ length: EVEN_ROWS - 1 }, (_, k) => ((k + 1) * end) / EVEN_ROWS);
  const marks = [...landmarks, ...even].filter((omega) => !axisFrequencies.includes(omega)).sort((a, b) => a - b);
  return ladder(first / BELOW, end, { pointsPerDecade: ROWS_PER_DECADE, landmarks: marks });
};

const columnsFor = ({ held }: SampledModel): number => Math.min(MOST_COLUMNS, COLUMNS * Math.ceil(1 + held.fastestSwing / Math.PI));

interface Search {
  readonly period: number;
  /** The loop's own delay, periods. */
  readonly present: number;
  readonly best: Hit | null;
}

/** The least delay at which this piece meets −1, if that is less than the best so far. */
const firstHit = (circle: DelayedCircle, piece: ContourPiece, { period, present, best }: Search): Hit | null => {
  const { from, to } = piece;
  const phaseTo = from.phase + wrapped(to.phase - from.phase);
  const rests = [circle.delayOf(from.rest), circle.delayOf(to.rest)];
  const earliest = Math.min(...rests);
  const least = present - Math.max(...rests) - SAME;
  const angle = Math.min(from.omega, to.omega) * period;
  const firstTurn = Math.floor((least * angle - Math.max(from.phase, phaseTo) - Math.PI) / TURN);
  let found: Hit | null = null;
  for (let turn = firstTurn; turn < firstTurn + MOST_TURNS && !found; turn += 1) {
    const ends: [number, number] = [
      (from.phase + Math.PI + TURN * turn) / (from.omega * period),
      (phaseTo + Math.PI + TURN * turn) / (to.omega * period),
    ];
    const [low, high] = [Math.min(...ends), Math.max(...ends)];
    if ((best && low - SAME + earliest > best.delay) || !(low < FARTHEST)) break;
    const first = Math.max(Math.ceil(low - SAME), Math.ceil(least));
    const last = Math.min(high + SAME, first + MOST_TURNS);
    for (let periods = first; periods <= last && !found; periods += 1) {
      if (best && periods + earliest - SAME > best.delay) break;
      const hit = hitAt(circle, piece, { period, periods, ends, turn });
      if (hit.delay >= present - SAME && hit.delay < (best?.delay ?? Infinity)) found = hit;
    }
  }
  return found;
};

interface Meeting {
  readonly period: number;
  readonly periods: number;
  /** Periods of delay that would be needed at either end. */
  readonly ends: readonly [number, number];
  readonly turn: number;
}

/** Where on a piece exactly `periods` whole periods bring L to −1. */
const hitAt = (circle: DelayedCircle, { from, to, rows }: ContourPiece, { period, periods, ends, turn }: Meeting): Hit => {
  const [a, b] = [ends[0] - periods, ends[1] - periods];
  const at = ({ rest, omega }: Pick<ContourPoint, 'rest' | 'omega'>): Hit => {
    const share = circle.delayOf(rest);
    return { delay: periods + share, omega: rest > 0 && share === 0 ? null : omega };
  };
  if (Math.abs(a) <= SAME) return at(from);
  if (Math.abs(b) <= SAME) return at(to);
  const needed = (rest: number) => {
    const { omega, phase } = contourAt(circle, rows, rest);
    const unwrapped = from.phase + wrapped(phase - from.phase);
    return (unwrapped + Math.PI + TURN * turn) / (omega * period) - periods;
  };
  const rest = bracketedRoot(needed, { a: from.rest, fa: a, b: to.rest, fb: b });
  return at(contourAt(circle, rows, rest));
};
