import type { Limit, Quantity } from '@/contract';

type Inside = (limit: number, bound: Limit['bound']) => number;

const byDecibels =
  (decibels: number): Inside =>
  (limit) =>
    limit * 10 ** (decibels / 20);
const by =
  (amount: number): Inside =>
  (limit) =>
    limit + amount;
const byShare =
  (share: number): Inside =>
  (limit, bound) =>
    bound === 'min' ? limit * (1 + share) : limit * (1 - share);

/** As numerics.md lists them; a quantity that is not here has no target unless one is named. */
const defaults: Partial<Record<Quantity, Inside>> = {
  gainMargin: byDecibels(1),
  gainReduction: byDecibels(-1),
  phaseMargin: by(5),
  ms: by(-0.1),
  mt: by(-0.1),
  modulusMargin: by(0.03),
  diskMargin: by(0.05),
  delayMargin: byShare(0.2),
  riseTime: byShare(0.1),
  settlingTime: byShare(0.1),
  loadSettlingTime: byShare(0.1),
  noiseGain: byShare(0.1),
};

/** The target that stands for one nobody named; null where the quantity has no default. @see numerics.md "Limits, targets, verdicts" */
export const defaultTarget = ({ quantity, bound, limit }: Pick<Limit, 'quantity' | 'bound' | 'limit'>): number | null =>
  defaults[quantity]?.(limit, bound) ?? null;

/** The target that a demand is judged against: the one it names, or the default; null where there is neither. */
export const targetOf = (demand: Pick<Limit, 'quantity' | 'bound' | 'limit' | 'target'>): number | null =>
  demand.target ?? defaultTarget(demand);
