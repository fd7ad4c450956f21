import type { Complex } from '@/analysis/numbers/complex';
import type { Rational } from './model';

/** Digits to which a sentence gives a number. */
const DIGITS = 4;

/**
 * A plant as a sentence an engineer can check at a glance.
 * @example 'Integrator, gain 2.1; lag of 0.35 s; dead time 0.08 s. By itself it does not settle: it integrates.'
 */
export const plantInWords = (plant: Rational, deadTime: number): string => {
  const order = plant.poles.filter(isOrigin).length - plant.zeros.filter(isOrigin).length;
  const parts = [gainInWords(order, gainAtOrigin(plant)), ...rootsInWords(plant.poles, POLE), ...rootsInWords(plant.zeros, ZERO)];
  if (deadTime > 0) parts.push(`dead time ${figure(deadTime)} s`);
  return `${parts.join('; ')}. ${stabilityInWords(plant.poles)}`;
};

interface Nouns {
  readonly stable: string;
  readonly unstable: string;
  readonly pair: string;
  readonly unstablePair: string;
}

const POLE: Nouns = { stable: 'lag of', unstable: 'unstable pole, growing with', pair: 'mode at', unstablePair: 'unstable mode at' };
const ZERO: Nouns = {
  stable: 'lead of',
  unstable: 'inverse response (right-half-plane zero) of',
  pair: 'zeros at',
  unstablePair: 'right-half-plane zeros at',
};

const isOrigin = ({ re, im }: Complex): boolean => re === 0 && im === 0;

/** Gain with every factor normalised to 1 at s = 0, powers of s aside. */
const gainAtOrigin = ({ gain, zeros, poles }: Rational): number => {
  const size = (roots: readonly Complex[]) =>
    roots.filter((root) => !isOrigin(root)).reduce((value, { re, im }) => value * (im === 0 ? -re : Math.hypot(re, im)), 1);
  return (gain * size(zeros)) / size(poles);
};

const gainInWords = (order: number, gain: number): string => {
  if (order === 0) return `Static gain ${figure(gain)}`;
  if (order < 0) return `${order === -1 ? 'Differentiating' : `Differentiating ${-order} times`}, gain ${figure(gain)}`;
  const name = ['Integrator', 'Double integrator', 'Triple integrator'][order - 1] ?? `${order} integrators`;
  return `${name}, gain ${figure(gain)}`;
};

const rootsInWords = (roots: readonly Complex[], nouns: Nouns): string[] => {
  const phrases = roots.filter((root) => root.im >= 0 && !isOrigin(root)).map((root) => rootInWords(root, nouns));
  return [...new Set(phrases)].map((phrase) => {
    const times = phrases.filter((other) => other === phrase).length;
    return times === 1 ? phrase : `${phrase} (${times} times)`;
  });
};

const rootInWords = ({ re, im }: Complex, nouns: Nouns): string => {
  if (im === 0) return `${re < 0 ? nouns.stable : nouns.unstable} ${figure(1 / Math.abs(re))} s`;
  const size = Math.hypot(re, im);
  const damping = re === 0 ? 'undamped' : `damping ${figure(-re / size)}`;
  return `${re > 0 ? nouns.unstablePair : nouns.pair} ${figure(size)} rad/s, ${damping}`;
};

const stabilityInWords = (poles: readonly Complex[]): string => {
  if (poles.some(({ re }) => re > 0)) return 'It is unstable by itself.';
  if (poles.some(({ re, im }) => re === 0 && im !== 0)) return 'By itself it oscillates without end.';
  if (poles.some(isOrigin)) return 'By itself it does not settle: it integrates.';
  return 'It is stable by itself.';
};

const figure = (value: number): string => String(Number(value.toPrecision(DIGITS))).replace('-', '−');
