import type { GainCrossover } from './crossovers';
import type { LoopFunction } from './loop-function';

const TURN = 2 * Math.PI;

/** Where |L| passes 1: every crossover, and on which side of 1 the axis starts. */
export interface GainPassages {
  readonly crossovers: readonly GainCrossover[];
  readonly startsOutside: boolean;
}

/**
 * Clockwise encirclements of −1 by L on the whole contour, indented to the right of imaginary-axis poles.
 *
 * Only stretches with |L| > 1 can pass the ray from −1 to −∞, and how often they pass it follows from the unwrapped phase at
 * their two ends: no grid, no step size. The phase starts on the real axis at s = 0 (or on the small arc round it) and falls
 * by 180° at an undamped pole, as the indented contour does. The lower half of the contour mirrors the upper.
 *
 * @see REFERENCES Nyquist 1932
 */
export const clockwiseEncirclements = (loop: LoopFunction, { crossovers, startsOutside }: GainPassages): number => {
  let outside = startsOutside;
  let entered = loop.atZero.loop.coefficient < 0 ? -0.5 : 0;
  let upward = 0;
  for (const { phase } of crossovers) {
    const passes = passesBelow(phase);
    if (outside) upward += passes - entered;
    else entered = passes;
    outside = !outside;
  }
  if (outside) upward += endOfContour(crossovers) - entered;
  return -2 * upward;
};

/** Passes of the ray between phase 0 and this one, upward; half a pass where the phase is on the ray. */
const passesBelow = (phase: number): number => Math.floor((phase + Math.PI) / TURN);

/** Where |L| > 1 as ω → ∞ the contour closes on the real axis, at the phase multiple of 180° nearest the last crossover. */
const endOfContour = (crossovers: readonly GainCrossover[]): number => {
  const last = crossovers.length > 0 ? crossovers[crossovers.length - 1].phase : 0;
  const half = Math.round(last / Math.PI);
  const onRay = half % 2 !== 0;
  return onRay ? (half + 1) / 2 - 0.5 : passesBelow(half * Math.PI);
};
