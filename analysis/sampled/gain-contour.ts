import { bracketedRoot } from '@/analysis/numbers/bracketed-root';
import type { CirclePoint, DelayedCircle } from './delayed-circle';

/** A point where |L| = 1: its frequency, its delay beyond whole periods, and arg L there, radians, wrapped. */
export interface ContourPoint {
  readonly omega: number;
  readonly rest: number;
  readonly phase: number;
}

/** A short stretch of the curve |L| = 1; at every rest between its ends it passes between the frequencies of `rows`. */
export interface ContourPiece {
  readonly from: ContourPoint;
  readonly to: ContourPoint;
  readonly rows: readonly [CirclePoint, CirclePoint];
}

/**
 * The curve |L| = 1 over frequency and delay, in pieces: every cell of a grid whose corners lie on both sides of 1 holds one,
 * and its ends on the cell's edges are found exactly.
 *
 * @param omegas ascending
 * @param columns how many cells one period of delay is cut into
 */
export const gainContour = (circle: DelayedCircle, omegas: readonly number[], columns: number): ContourPiece[] => {
  const rests = Array.from({ length: columns + 1 }, (_, c) => c / columns);
  const numerators = circle.numerators(rests);
  const rows = omegas.map((omega) => circle.point(omega));
  const logs = rows.map((row) => numerators.map((numerator) => circle.logAt(row, numerator)));
  const edges = new Edges(circle, { rests, numerators, rows, logs });
  const pieces: ContourPiece[] = [];
  for (let i = 0; i + 1 < rows.length; i += 1) {
    for (let c = 0; c < columns; c += 1) {
      const [low, high] = [logs[i], logs[i + 1]];
      const outside = [low[c] > 0, low[c + 1] > 0, high[c] > 0, high[c + 1] > 0];
      if (outside.every((side) => side === outside[0])) continue;
      const ends = edges.around(i, c);
      for (let k = 0; k + 1 < ends.length; k += 2) pieces.push({ from: ends[k], to: ends[k + 1], rows: [rows[i], rows[i + 1]] });
    }
  }
  return pieces;
};

interface ContourGrid {
  readonly rests: readonly number[];
  readonly numerators: readonly (readonly number[])[];
  readonly rows: readonly CirclePoint[];
  /** ln|L| by row and column. */
  readonly logs: readonly (readonly number[])[];
}

/** Where the curve passes the edges of the grid's cells; each edge is shared by two cells and solved once. */
class Edges {
  private readonly known = new Map<string, ContourPoint | null>();

  constructor(
    private readonly circle: DelayedCircle,
    private readonly grid: ContourGrid,
  ) {}

  /** Passages of one cell's edges, each two that belong together one after the other. */
  around(i: number, c: number): ContourPoint[] {
    const left = this.alongColumn(i, c);
    const right = this.alongColumn(i, c + 1);
    const bottom = this.alongRow(i, c);
    const top = this.alongRow(i + 1, c);
    const passages = left && right && bottom && top ? [left, bottom, right, top] : [left, right, bottom, top];
    return passages.filter((point) => point !== null);
  }

  private alongColumn(i: number, c: number): ContourPoint | null {
    const { rests, numerators, rows, logs } = this.grid;
    return this.once(`column ${i} ${c}`, logs[i][c], logs[i + 1][c], () => {
      const log = (omega: number) => this.circle.logAt(this.circle.point(omega), numerators[c]);
      const omega = bracketedRoot(log, { a: rows[i].omega, fa: logs[i][c], b: rows[i + 1].omega, fb: logs[i + 1][c] });
      return pointOf(this.circle, this.circle.point(omega), { rest: rests[c], numerator: numerators[c] });
    });
  }

  private alongRow(i: number, c: number): ContourPoint | null {
    const { rests, rows, logs } = this.grid;
    return this.once(`row ${i} ${c}`, logs[i][c], logs[i][c + 1], () => {
      const log = (rest: number) => this.circle.logAt(rows[i], this.circle.numerators([rest])[0]);
      const rest = bracketedRoot(log, { a: rests[c], fa: logs[i][c], b: rests[c + 1], fb: logs[i][c + 1] });
      return pointOf(this.circle, rows[i], { rest, numerator: this.circle.numerators([rest])[0] });
    });
  }

  private once(key: string, from: number, to: number, solve: () => ContourPoint): ContourPoint | null {
    if (from > 0 === to > 0) return null;
    let point = this.known.get(key);
    if (point === undefined) {
      point = solve();
      this.known.set(key, point);
    }
    return point;
  }
}

/** The point of the curve between two frequencies at a given rest. */
export const contourAt = (circle: DelayedCircle, [low, high]: ContourPiece['rows'], rest: number): ContourPoint => {
  const [numerator] = circle.numerators([rest]);
  const log = (omega: number) => circle.logAt(circle.point(omega), numerator);
  const omega = bracketedRoot(log, { a: low.omega, fa: circle.logAt(low, numerator), b: high.omega, fb: circle.logAt(high, numerator) });
  return pointOf(circle, circle.point(omega), { rest, numerator });
};

const pointOf = (
  circle: DelayedCircle,
  point: CirclePoint,
  { rest, numerator }: { rest: number; numerator: readonly number[] },
): ContourPoint => {
  circle.evaluate(point, numerator);
  return { omega: point.omega, rest, phase: Math.atan2(circle.im, circle.re) };
};
