import { Quantity } from '@/contract';
import type { KeptAnalysis } from '@/contract';

/** What is worth a look though nobody demands anything of it. */
const always: readonly Quantity[] = ['ms', 'phaseMargin', 'gainMargin', 'delayMargin', 'settlingTime'];

export interface ShownQuantities {
  /** Those with a limit in the order of the limits, then the usual ones. */
  readonly first: readonly Quantity[];
  readonly rest: readonly Quantity[];
}

/** Which numbers stand as tabs, and which in the list behind them. */
export function shownQuantities(analysis: KeptAnalysis | null): ShownQuantities {
  const limited = analysis?.inputs.limits.map(({ quantity }) => quantity) ?? [];
  const first = [...new Set([...limited, ...always])];
  return { first, rest: Quantity.options.filter((quantity) => !first.includes(quantity)) };
}

/** The number that is shown: the one that the address names, else that of the headline. */
export function shownQuantity(wanted: string | undefined, analysis: KeptAnalysis | null): Quantity {
  const named = Quantity.options.find((quantity) => quantity === wanted);
  return named ?? analysis?.headline.quantity ?? 'ms';
}
