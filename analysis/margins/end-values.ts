import type { Asymptote } from '@/analysis/loop/axis-product';
import type { EndOfAxis, LoopFunction } from './loop-function';

/** |S|, |T|, |(S − T)/2| and |K·C_y·S| at an end of the axis; Infinity where they grow without bound. */
export interface EndValues {
  readonly sensitivity: number;
  readonly complementarySensitivity: number;
  readonly balancedSensitivity: number;
  readonly noiseSensitivity: number;
  readonly referenceResponse: number;
}

/** |L| at an end: 0, finite, or Infinity. */
export const limitOf = ({ coefficient, power }: Asymptote, end: 'zero' | 'infinity'): number => {
  if (coefficient === 0) return 0;
  const growth = end === 'zero' ? -power : power;
  if (growth === 0) return coefficient;
  return growth > 0 ? Infinity * Math.sign(coefficient) : 0;
};

export const valuesAtZero = (loop: LoopFunction): EndValues => values(loop.atZero, 'zero', limitOf(loop.atZero.loop, 'zero'));

/** With dead time the phase goes round for ever: what is approached is the worst turn of it, L = −|L(∞)|. */
export const valuesAtInfinity = (loop: LoopFunction): EndValues => {
  const limit = limitOf(loop.atInfinity.loop, 'infinity');
  return values(loop.atInfinity, 'infinity', loop.deadTime > 0 ? -Math.abs(limit) : limit);
};

const values = (end: EndOfAxis, which: 'zero' | 'infinity', loop: number): EndValues => {
  const through = (signal: Asymptote) => {
    if (!Number.isFinite(loop))
      return Math.abs(limitOf({ coefficient: signal.coefficient / end.loop.coefficient, power: signal.power - end.loop.power }, which));
    const value = Math.abs(limitOf(signal, which));
    return value === 0 ? 0 : value / Math.abs(1 + loop);
  };
  const finite = Number.isFinite(loop);
  return {
    sensitivity: finite ? 1 / Math.abs(1 + loop) : 0,
    complementarySensitivity: finite ? Math.abs(loop / (1 + loop)) : 1,
    balancedSensitivity: finite ? Math.abs((1 - loop) / (2 * (1 + loop))) : 0.5,
    noiseSensitivity: through(end.command),
    referenceResponse: through(end.reference),
  };
};
