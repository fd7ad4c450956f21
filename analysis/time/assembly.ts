import type { Complex } from '@/analysis/numbers/complex';
import type { Rational } from '@/analysis/loop/model';
import { sectionsOf, type Section } from './section';

/** A signal as a linear combination of all states and then all inputs. */
export type Signal = Float64Array;

/**
 * Builds ẋ = A·[x; inputs] block by block. Signals are rows over [states, inputs]; feeding one through a rational
 * function appends that function's states and answers its output, again as a row.
 */
export class Assembly {
  /** Row i is the derivative of state i. */
  readonly derivatives: Signal[] = [];

  constructor(
    private readonly order: number,
    private readonly inputs: number,
  ) {}

  input(index: number): Signal {
    return this.unit(this.order + index);
  }

  /** The output of `block` driven by `signal`. */
  feed(block: Rational, signal: Signal): Signal {
    const out = sectionsOf(block).reduce((current, section) => this.feedSection(section, current), signal);
    return combine([block.gain, out]);
  }

  private unit(index: number): Signal {
    const row = new Float64Array(this.order + this.inputs);
    row[index] = 1;
    return row;
  }

  private append(derivative: Signal): void {
    this.derivatives.push(derivative);
  }

  private feedSection(section: Section, signal: Signal): Signal {
    const [first, second] = section.poles;
    const state = this.unit(this.derivatives.length);
    if (!second) {
      const drive = sizeOf(first);
      this.append(combine([first.re, state], [drive, signal]));
      const [zero] = section.zeros;
      return zero ? combine([1, signal], [(first.re - zero.re) / drive, state]) : combine([1 / drive, state]);
    }
    const next = this.unit(this.derivatives.length + 1);
    return this.feedPair(section, signal, [state, next]);
  }

  /**
   * Two poles: ẋ₁ = p₁·x₁ + γ·x₂, ẋ₂ = κ·x₁ + p₂·x₂ + β·w, with p₁, p₂ the real poles and κ = 0, or both the real part of
   * a pair and κ = −ω²/γ. Then x₂ = β·(s − p₁)/den and x₁ = β·γ/den, from which the numerator's remainder is made up.
   */
  private feedPair({ poles: [p, q], zeros }: Section, signal: Signal, [x1, x2]: readonly [Signal, Signal]): Signal {
    const coupling = sizeOf(p);
    const drive = sizeOf(q);
    this.append(combine([p.re, x1], [coupling, x2]));
    this.append(combine([-(p.im * p.im) / coupling, x1], [q.re, x2], [drive, signal]));
    const { slope, level, direct } = remainder([p, q], zeros);
    return combine([direct, signal], [slope / drive, x2], [(level + slope * p.re) / (drive * coupling), x1]);
  }
}

/** Σ weight·signal. */
export function combine(...terms: readonly (readonly [weight: number, signal: Signal])[]): Signal {
  const sum = new Float64Array(terms[0][1].length);
  for (const [weight, signal] of terms) {
    if (weight === 0) continue;
    for (let i = 0; i < sum.length; i += 1) sum[i] += weight * signal[i];
  }
  return sum;
}

const sizeOf = (pole: Complex): number => Math.hypot(pole.re, pole.im) || 1;

/** Π(s − zero)/((s − p)(s − q)) = direct + (slope·s + level)/((s − p)(s − q)). */
function remainder([p, q]: readonly Complex[], zeros: readonly Complex[]): { slope: number; level: number; direct: number } {
  const product = (a: Complex, b: Complex) => a.re * b.re - a.im * b.im;
  if (zeros.length === 0) return { slope: 0, level: 1, direct: 0 };
  if (zeros.length === 1) return { slope: 1, level: -zeros[0].re, direct: 0 };
  const [y, z] = zeros;
  return { slope: p.re + q.re - y.re - z.re, level: product(y, z) - product(p, q), direct: 1 };
}
