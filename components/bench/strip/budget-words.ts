import type { Analysis, Loop } from '@/contract';
import { formatDegrees, formatFrequency, withUnit } from '@/figures/format';
import type { ReaderUnits } from '@/figures/quantity-text';

export interface BudgetWords {
  readonly lead: string;
  readonly text: string;
}

const DEGREES = 180 / Math.PI;
const deadTimeOf = ({ plant }: Loop): number => ('deadTime' in plant ? plant.deadTime : 0);

/** What delays cost at the crossover that gives the phase margin: dead time, the sensor's, its lag. Null where there is none. */
export function budgetWords(loop: Loop, { margins }: Analysis, units: ReaderUnits): BudgetWords | null {
  const frequency = margins.phase?.frequency;
  if (frequency === undefined) return null;
  const sensor = loop.sensor ?? { timeConstant: 0, deadTime: 0 };
  const costs: readonly (readonly [string, number])[] = [
    ['dead time', frequency * deadTimeOf(loop) * DEGREES],
    ['sensor delay', frequency * sensor.deadTime * DEGREES],
    ['sensor lag', Math.atan(frequency * sensor.timeConstant) * DEGREES],
  ];
  const told = costs.filter(([, degrees]) => degrees > 0).map(([name, degrees]) => `${name} ${formatDegrees(degrees)}°`);
  const place = withUnit(formatFrequency(frequency, units.frequency), units.frequency);
  return { lead: `Phase at crossover ${place}:`, text: told.length > 0 ? told.join(', ') : 'no dead time' };
}

/** How the loop is sampled, or that nobody said. */
export const samplingWords = (statedContinuous: boolean, period: number | null): string => {
  if (period !== null) return `sampled, ${Number((period * 1000).toPrecision(6))} ms`;
  return statedContinuous ? 'continuous, as stated' : 'nobody said how it is sampled';
};
