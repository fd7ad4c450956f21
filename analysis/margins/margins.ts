import type { Margins } from '@/contract';
import type { GainCrossover, PhaseCrossover } from './crossovers';

const TURN = 2 * Math.PI;
const DEGREES = 180 / Math.PI;

/** An angle in radians wrapped to (−π, π]. */
export const wrapped = (angle: number): number => angle - TURN * Math.ceil((angle - Math.PI) / TURN);

/** 180° + arg L, wrapped to (−180°, 180°]. */
export const phaseMarginDegrees = ({ phase }: GainCrossover): number => wrapped(phase + Math.PI) * DEGREES;

/** Of all phase margins the one nearest 0, with its sign. */
export const phaseMargin = (crossovers: readonly GainCrossover[]): Margins['phase'] => {
  let best: Margins['phase'] = null;
  for (const crossover of crossovers) {
    const degrees = phaseMarginDegrees(crossover);
    if (best === null || Math.abs(degrees) < Math.abs(best.degrees)) best = { degrees, frequency: crossover.frequency };
  }
  return best;
};

/** The smallest factor above 1 (`upward`), or the largest below. */
export const gainMargin = (crossovers: readonly PhaseCrossover[], direction: 'upward' | 'downward'): Margins['gain'] => {
  let best: Margins['gain'] = null;
  for (const { frequency, gain } of crossovers) {
    const factor = 1 / gain;
    const candidate =
      direction === 'upward'
        ? factor > 1 && (best === null || factor < best.factor)
        : factor < 1 && (best === null || factor > best.factor);
    if (candidate) best = { factor, decibels: decibels(factor), frequency };
  }
  return best;
};

/** The least extra dead time that brings some crossover to −180°: phase margin in [0, 2π) over ω. */
export const delayMargin = (crossovers: readonly GainCrossover[], gainAtInfinity: number): Margins['delay'] => {
  if (gainAtInfinity >= 1) return { seconds: 0, frequency: null };
  let best: Margins['delay'] = null;
  for (const { frequency, phase } of crossovers) {
    const margin = wrapped(phase + Math.PI);
    const seconds = (margin < 0 ? margin + TURN : margin) / frequency;
    if (best === null || seconds < best.seconds) best = { seconds, frequency };
  }
  return best;
};

/** The balanced disk margin from the peak of |(S − T)/2|. @see REFERENCES Seiler 2020, section "Symmetric disk margin" */
export const diskMargin = (peak: number): Margins['disk'] => {
  const alpha = 1 / peak;
  return {
    alpha,
    gainLow: (2 - alpha) / (2 + alpha),
    gainHigh: alpha < 2 ? (2 + alpha) / (2 - alpha) : null,
    phaseDegrees: 2 * Math.atan(alpha / 2) * DEGREES,
  };
};

export const decibels = (factor: number): number => 20 * Math.log10(factor);
