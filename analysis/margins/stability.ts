import type { ClosedLoop } from '@/contract';
import type { LoopModel } from '@/analysis/loop/model';
import type { Complex } from '@/analysis/numbers/complex';
import { closedLoopPoles } from './closed-loop-poles';
import { clockwiseEncirclements, type GainPassages } from './encirclements';
import { limitOf } from './end-values';
import { hiddenModes } from './hidden-modes';
import type { LoopFunction } from './loop-function';

/** A pole this near to the imaginary axis, relative to its size, is on it. */
const ON_BOUNDARY = 1e-9;

export interface Stability extends Omit<ClosedLoop, 'poles'> {
  /** null with dead time in the loop: infinitely many. */
  readonly poles: readonly Complex[] | null;
  /** Modes of Re s ≥ 0 that the loop cancels inside itself. */
  readonly hidden: readonly Complex[];
  /** A closed-loop pole lies on the imaginary axis, to within what numerics.md calls the boundary. */
  readonly onBoundary: boolean;
}

export interface Crossings extends GainPassages {
  /** Least |1 + L| on the axis. */
  readonly modulus: number;
}

/**
 * Closed-loop stability by numerics.md "Stability": roots of numerator + denominator without dead time, Z = N + P with it.
 * Boundary poles and hidden modes count as unstable. A loop whose gain is zero is open: its poles are those of its parts.
 */
export const judgeStability = (model: LoopModel, loop: LoopFunction, crossings: Crossings): Stability => {
  const parts = [model.plant, model.filters, model.controller, model.sensor];
  const openPoles = parts.flatMap((part) => part.poles);
  const openUnstable = openPoles.filter((pole) => pole.re > 0).length;
  const hidden = hiddenModes(parts);
  const size = smallestMagnitude([...openPoles, ...parts.flatMap((part) => part.zeros)]);
  if (loop.deadTime > 0 && !loop.isZero) return byEncirclements(loop, crossings, { openUnstable, hidden });
  const poles = loop.isZero ? openPoles : closedLoopPoles(parts);
  const boundary = poles.filter((pole) => isOnBoundary(pole, size)).length;
  const inside = poles.filter((pole) => pole.re > 0 && !isOnBoundary(pole, size)).length;
  return {
    stable: boundary + inside === 0,
    unstablePoles: boundary + inside,
    encirclements: inside - openUnstable,
    encirclementsNeeded: openUnstable === 0 ? 0 : -openUnstable,
    poles,
    hidden,
    onBoundary: boundary > 0,
  };
};

const byEncirclements = (
  loop: LoopFunction,
  crossings: Crossings,
  open: { openUnstable: number; hidden: readonly Complex[] },
): Stability => {
  const encirclements = clockwiseEncirclements(loop, crossings) || 0;
  const hiddenOnAxis = open.hidden.filter((mode) => mode.re === 0).length;
  const onBoundary = crossings.modulus < ON_BOUNDARY;
  const endless = Math.abs(limitOf(loop.atInfinity.loop, 'infinity')) >= 1;
  const unstable = Math.max(encirclements + open.openUnstable, 0) + hiddenOnAxis;
  const unstablePoles = (onBoundary || endless) && unstable === 0 ? 2 : unstable;
  return {
    stable: unstablePoles === 0,
    unstablePoles,
    encirclements,
    encirclementsNeeded: open.openUnstable === 0 ? 0 : -open.openUnstable,
    poles: null,
    hidden: open.hidden,
    onBoundary,
  };
};

const isOnBoundary = ({ re, im }: Complex, smallest: number): boolean =>
  Math.abs(re) <= ON_BOUNDARY * Math.max(Math.hypot(re, im), smallest);

const smallestMagnitude = (roots: readonly Complex[]): number => {
  const sizes = roots.map(({ re, im }) => Math.hypot(re, im)).filter((size) => size > 0);
  return sizes.length > 0 ? Math.min(...sizes) : 0;
};
