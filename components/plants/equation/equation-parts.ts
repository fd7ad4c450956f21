import type { PlantDescription } from '@/analysis';
import type { PlantModel } from '@/contract';
import { factorText } from './factor-text';
import { coefficientText, polynomialText } from './polynomial-text';

/** A plant as it is typeset: over/under times e to the delay. */
export interface EquationParts {
  over: string;
  /** "1" where there is nothing below the line. */
  under: string;
  /** "−0.08 s"; null without dead time. */
  delay: string | null;
}

/** Polynomials as they were given; roots and formulas as factors. */
export function equationParts(kind: PlantModel['kind'], read: PlantDescription): EquationParts {
  const delay = read.deadTime > 0 ? `−${coefficientText(read.deadTime)} s` : null;
  if (kind === 'coefficients') return { over: polynomialText(read.numerator), under: polynomialText(read.denominator), delay };
  return { over: factorText(read.gain, read.zeros), under: factorText(1, read.poles), delay };
}
