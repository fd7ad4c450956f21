import type { Rational } from '@/analysis/loop/model';
import { withoutLeadingZeros } from '@/analysis/numbers/polynomial';
import { polynomialRoots } from '@/analysis/numbers/polynomial-roots';
import type { HeldPlant } from './held-plant';
import type { SplitDelay } from './split-delay';

/** z^(−periods) times a rational function of w = z − 1. */
export interface PulseTransfer {
  readonly rational: Rational;
  readonly periods: number;
}

/**
 * What the computer sees of a held plant behind a delay: the exact zero-order-hold equivalent. A delay of n periods and a
 * rest r is the output at the share 1 − r of the period that began n + 1 samples ago: the hold is split there.
 */
export const pulseTransfer = (held: HeldPlant, { periods, rest }: SplitDelay): PulseTransfer => {
  const numerator = withoutLeadingZeros(rest === 0 ? held.atSample() : held.after([1 - rest])[0]);
  return {
    rational: { gain: numerator[0] ?? 0, zeros: numerator.length > 0 ? polynomialRoots(numerator) : [], poles: held.poles },
    periods: rest === 0 ? periods : periods + 1,
  };
};
