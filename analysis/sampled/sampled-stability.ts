import type { Rational } from '@/analysis/loop/model';
import { closedLoopPoles } from '@/analysis/margins/closed-loop-poles';
import { clockwiseEncirclements } from '@/analysis/margins/encirclements';
import { hiddenModes } from '@/analysis/margins/hidden-modes';
import type { Crossings, Stability } from '@/analysis/margins/stability';
import type { Complex } from '@/analysis/numbers/complex';
import { inW } from './planes';
import type { SampledLoop } from './sampled-loop';
import type { SampledModel } from './sampled-model';

/** A pole is on the unit circle from this far inside it. */
const ON_BOUNDARY = 1e-9;

/** Beyond so many poles, most of them delay, stability is counted on the circle and the poles are not listed. */
const MOST_POLES = 80;

/**
 * Closed-loop stability of a sampled loop: every pole in |z| < 1 − 1e-9 and no mode on or outside the circle cancelled inside
 * the loop. Poles are found in w = z − 1 and answered in z.
 */
export const judgeSampled = (model: SampledModel, loop: SampledLoop, crossings: Crossings): Stability => {
  const inV = [model.loopPlant.rational, model.filters, model.controller];
  const hidden = hiddenModes(inV).map(zOfV);
  const openUnstable = inV.flatMap((part) => part.poles).filter(({ re }) => re > 0).length;
  const needed = openUnstable === 0 ? 0 : -openUnstable;
  const order = inV.reduce((sum, part) => sum + part.poles.length, model.loopPlant.periods);
  if (order > MOST_POLES) return byEncirclements(loop, crossings, { openUnstable, hidden });
  const found = loop.isZero ? openPoles(model) : closedLoopPoles(partsInW(model));
  const poles = found.map(({ re, im }) => ({ re: 1 + re, im }));
  const beyond = found.map(radiusBeyondOne);
  const boundary = beyond.filter((excess) => Math.abs(excess) <= ON_BOUNDARY).length;
  const outside = beyond.filter((excess) => excess > ON_BOUNDARY).length;
  return {
    stable: boundary + outside === 0,
    unstablePoles: boundary + outside,
    encirclements: outside - openUnstable,
    encirclementsNeeded: needed,
    poles,
    hidden,
    onBoundary: boundary > 0,
  };
};

/** What the loop is made of as functions of w, whole periods of delay as poles at z = 0. */
export const partsInW = ({ seen, controller, filters }: SampledModel): Rational[] => {
  const atZero = Array.from({ length: seen.periods }, () => ({ re: -1, im: 0 }));
  return [{ ...seen.rational, poles: [...seen.rational.poles, ...atZero] }, inW(controller), inW(filters)];
};

const openPoles = (model: SampledModel): Complex[] => partsInW(model).flatMap((part) => part.poles);

/** |1 + w| − 1 without cancellation. */
const radiusBeyondOne = ({ re, im }: Complex): number => (2 * re + re * re + im * im) / (1 + Math.hypot(1 + re, im));

/** (1 + v)/(1 − v). */
const zOfV = ({ re, im }: Complex): Complex => {
  const square = (1 - re) * (1 - re) + im * im;
  return { re: (1 - re * re - im * im) / square, im: (2 * im) / square };
};

const byEncirclements = (
  loop: SampledLoop,
  crossings: Crossings,
  { openUnstable, hidden }: { openUnstable: number; hidden: readonly Complex[] },
): Stability => {
  const encirclements = clockwiseEncirclements(loop, crossings) || 0;
  const onBoundary = crossings.modulus < ON_BOUNDARY;
  const hiddenOnCircle = hidden.filter(({ re, im }) => Math.abs(Math.hypot(re, im) - 1) <= ON_BOUNDARY).length;
  const counted = Math.max(encirclements + openUnstable, 0) + hiddenOnCircle;
  const unstablePoles = onBoundary && counted === 0 ? 1 : counted;
  return {
    stable: unstablePoles === 0,
    unstablePoles,
    encirclements,
    encirclementsNeeded: openUnstable === 0 ? 0 : -openUnstable,
    poles: null,
    hidden,
    onBoundary,
  };
};
