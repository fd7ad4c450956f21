import type { Limit, Quantity } from '@/contract';

/** Limits to begin from. The numbers are common practice; whoever takes a set makes it their own. */
export interface StartingSet {
  readonly name: string;
  readonly about: string;
  readonly limits: readonly Limit[];
}

const decibels = (value: number) => 10 ** (value / 20);

function set(name: string, about: string, demands: readonly (readonly [Quantity, Limit['bound'], number])[]): StartingSet {
  const source = `starting set, ${name}`;
  return { name, about, limits: demands.map(([quantity, bound, limit]) => ({ quantity, bound, limit, target: null, source })) };
}

export const startingSets: readonly StartingSet[] = [
  set('cautious first run', 'For a plant that nobody has driven: Ms 1.40, 60° and 10 dB, little overshoot.', [
    ['ms', 'max', 1.4],
    ['phaseMargin', 'min', 60],
    ['gainMargin', 'min', decibels(10)],
    ['gainReduction', 'max', decibels(-10)],
    ['overshootPercent', 'max', 5],
  ]),
  set('normal session', 'For a plant known from logs: Ms 1.70, 45° and 6 dB.', [
    ['ms', 'max', 1.7],
    ['phaseMargin', 'min', 45],
    ['gainMargin', 'min', decibels(6)],
    ['gainReduction', 'max', decibels(-6)],
    ['overshootPercent', 'max', 15],
  ]),
  set('Ms only', 'One number for the distance from −1: Ms 1.70.', [['ms', 'max', 1.7]]),
];
