import type { Limit } from '@/contract';

/** Limits to begin with: a name, when to take them, and the limits themselves, all of them editable once taken. */
export interface StartingSet {
  readonly id: 'firstRun' | 'session' | 'msAlone';
  readonly name: string;
  readonly when: string;
  readonly items: readonly Limit[];
}

const factor = (decibels: number) => 10 ** (decibels / 20);

const demand = (quantity: Limit['quantity'], bound: Limit['bound'], limit: number, source: string): Limit => ({
  quantity,
  bound,
  limit,
  target: null,
  source,
});

/** The numbers are common practice in loop tuning: Ms from 1.4 to 2, phase margin from 30° to 60°, gain margin from 6 dB up. */
export const startingSets: readonly StartingSet[] = [
  {
    id: 'firstRun',
    name: 'A cautious first run',
    when: 'Before anything was driven, or where nobody can watch the loop.',
    items: [
      demand('ms', 'max', 1.4, 'common practice, the careful end'),
      demand('phaseMargin', 'min', 60, 'common practice, the careful end'),
      demand('gainMargin', 'min', factor(10), 'common practice, the careful end'),
    ],
  },
  {
    id: 'session',
    name: 'A normal session',
    when: 'On a car that has run with this loop, with a driver who can take over.',
    items: [
      demand('ms', 'max', 1.7, 'common practice'),
      demand('phaseMargin', 'min', 45, 'common practice'),
      demand('gainMargin', 'min', factor(6), 'common practice'),
    ],
  },
  {
    id: 'msAlone',
    name: 'Ms alone',
    when: 'One number for gain, phase and everything between them: Ms 1.70 alone leaves at least 7.7 dB and 34°.',
    items: [demand('ms', 'max', 1.7, 'common practice')],
  },
];
