import { visitPieces } from './pieces';
import type { Probe } from './probe';
import type { Quantity } from './quantities';

/** ln √2: 3.01 dB. */
const HALF_POWER = Math.LN2 / 2;

/** Smallest ω where e^quantity falls below its value at ω = 0 over √2; null where it never does, or starts at 0 or ∞. */
export const fallsFrom = (probe: Probe, quantity: Quantity, atZero: number): number | null =>
  atZero > 0 && Number.isFinite(atZero) ? firstPassage(probe, quantity, { level: Math.log(atZero) - HALF_POWER, rising: false }) : null;

/** Smallest ω where |S| rises through 1/√2. */
export const risesThroughHalfPower = (probe: Probe, quantity: Quantity): number | null =>
  firstPassage(probe, quantity, { level: -HALF_POWER, rising: true });

const firstPassage = (probe: Probe, quantity: Quantity, { level, rising }: { level: number; rising: boolean }): number | null => {
  let passage: number | null = null;
  visitPieces(probe, quantity, {
    matters: (least, most) => least <= level && most >= level,
    visit: ({ a, valueA, b, valueB }) => {
      const passes = rising ? valueA < level && valueB >= level : valueA >= level && valueB < level;
      if (!passes) return false;
      passage = probe.crossing(quantity, level, { a, valueA, b, valueB });
      return true;
    },
  });
  return passage;
};
