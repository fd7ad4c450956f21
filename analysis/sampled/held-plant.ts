import type { Rational } from '@/analysis/loop/model';
import type { Complex } from '@/analysis/numbers/complex';
import { scaledBy, type Matrix } from '@/analysis/numbers/matrix';
import { ExponentialChanges } from '@/analysis/numbers/matrix-exponential';
import { expandRoots } from '@/analysis/numbers/polynomial';
import { mapRoots, shiftedRoot } from './planes';
import { dot, rowAfter } from './rows';
import { stateEquations, type StateEquations } from './state-equations';

/**
 * A continuous function behind a zero-order hold, sampled at any share of the period: exact for every share.
 *
 * With x[k+1] − x[k] = E·x[k] + Γ·u[k] the output at (k + share)·h is row·x[k] + direct·u[k], so in w = z − 1 it is
 * (Σ nⱼ·wⁿ⁻ʲ)/Π(w − pole) with nⱼ = aⱼ·direct + row·Vⱼ and Vⱼ₊₁ = E·Vⱼ + aⱼ·Γ, where aⱼ are the denominator's coefficients.
 *
 * @see REFERENCES Åström & Wittenmark 1997, Van Loan 1978, Faddeev 1959
 */
export class HeldPlant {
  /** In w. */
  readonly poles: readonly Complex[];
  /** Radians that the fastest swing turns within a period. */
  readonly fastestSwing: number;
  private readonly equations: StateEquations;
  private readonly denominator: readonly number[];
  private readonly vectors: readonly Float64Array[];
  private readonly isWashedOut: boolean;

  constructor(
    parts: readonly Rational[],
    private readonly period: number,
  ) {
    this.equations = stateEquations(parts);
    const roots = parts.flatMap((part) => part.poles);
    this.poles = mapRoots(roots, (root) => shiftedRoot(root, period));
    this.fastestSwing = period * Math.max(...roots.map(({ im }) => im), 0);
    this.denominator = expandRoots(this.poles);
    const [change] = this.changes([1]);
    this.vectors = numeratorVectors(change, this.denominator);
    const atOrigin = (side: 'zeros' | 'poles') => parts.flatMap((part) => part[side]).filter(({ re, im }) => re === 0 && im === 0).length;
    this.isWashedOut = atOrigin('zeros') > atOrigin('poles');
  }

  /** Whether the output answers its input at once: it then jumps where the input does. */
  get isImmediate(): boolean {
    return this.atSample()[0] !== 0;
  }

  /** Numerator, descending in w, of the output at the sample itself: its input is the one that begins there. */
  atSample(): number[] {
    const { output } = this.equations;
    return this.numerator(output.subarray(0, output.length - 1), output[output.length - 1]);
  }

  /** Numerators of the output at these shares of the period after the sample, each in (0, 1]. */
  after(shares: readonly number[]): number[][] {
    const { output } = this.equations;
    const size = output.length;
    return this.changes(shares).map((change) => {
      const row = rowAfter(output, change);
      return this.numerator(row.subarray(0, size - 1), row[size - 1]);
    });
  }

  private changes(shares: readonly number[]): readonly Matrix[] {
    const { dynamics } = this.equations;
    return new ExponentialChanges(dynamics.rows, shares).of(scaledBy(dynamics, this.period));
  }

  private numerator(row: Float64Array, direct: number): number[] {
    const { inputScale } = this.equations;
    const coefficients = this.denominator.map((a, j) => (a * direct + (j === 0 ? 0 : dot(row, this.vectors[j - 1]))) / inputScale);
    if (this.isWashedOut) coefficients[coefficients.length - 1] = 0;
    return coefficients;
  }
}

/** V₁ … Vₙ from e^(M·h) − I, whose last column is Γ. */
const numeratorVectors = ({ rows, data }: Matrix, denominator: readonly number[]): Float64Array[] => {
  const order = rows - 1;
  const vectors: Float64Array[] = [];
  let last = new Float64Array(order);
  for (let j = 0; j < order; j += 1) {
    const next = new Float64Array(order);
    for (let i = 0; i < order; i += 1) {
      let sum = denominator[j] * data[i * rows + order];
      for (let k = 0; k < order; k += 1) sum += data[i * rows + k] * last[k];
      next[i] = sum;
    }
    vectors.push(next);
    last = next;
  }
  return vectors;
};
