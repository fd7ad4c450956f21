import { filterPhaseDegrees } from '@/analysis';
import type { Analysis, Filter, Loop } from '@/contract';
import { formatDegrees, formatFrequency, withUnit } from '@/figures/format';
import type { ReaderUnits } from '@/figures/quantity-text';

export interface BudgetWords {
  readonly lead: string;
  readonly text: string;
}

const DEGREES = 180 / Math.PI;
const deadTimeOf = ({ plant }: Loop): number => ('deadTime' in plant ? plant.deadTime : 0);

const filterNames: Readonly<Record<Filter['kind'], string>> = { lowPass: 'low-pass', notch: 'notch', leadLag: 'lead-lag' };

/** What the filters of each kind cost together. */
function filterCosts({ controller: { filters } }: Loop, frequency: number): readonly (readonly [string, number])[] {
  return (Object.keys(filterNames) as Filter['kind'][]).map((kind) => {
    const degrees = filters.filter((filter) => filter.kind === kind).map((filter) => -filterPhaseDegrees(filter, frequency));
    return [filterNames[kind], degrees.reduce((sum, cost) => sum + cost, 0)];
  });
}

/** Of a cost in degrees of lag, what is printed: lead is called so. */
const told = ([name, degrees]: readonly [string, number]): string =>
  degrees > 0 ? `${name} ${formatDegrees(degrees)}°` : `${name} ${formatDegrees(-degrees)}° lead`;

/** What delays and filters cost at the crossover that gives the phase margin. Null where there is none. */
export function budgetWords(loop: Loop, { margins }: Analysis, units: ReaderUnits): BudgetWords | null {
  const frequency = margins.phase?.frequency;
  if (frequency === undefined) return null;
  const sensor = loop.sensor ?? { timeConstant: 0, deadTime: 0 };
  const costs: readonly (readonly [string, number])[] = [
    ['dead time', frequency * deadTimeOf(loop) * DEGREES],
    ['sensor delay', frequency * sensor.deadTime * DEGREES],
    ['sensor lag', Math.atan(frequency * sensor.timeConstant) * DEGREES],
    ...filterCosts(loop, frequency),
  ];
  const named = costs.filter(([, degrees]) => degrees !== 0).map(told);
  const place = withUnit(formatFrequency(frequency, units.frequency), units.frequency);
  return { lead: `Phase at crossover ${place}:`, text: named.length > 0 ? named.join(', ') : 'no dead time' };
}

/** How the loop is sampled, or that nobody said. */
export const samplingWords = (statedContinuous: boolean, period: number | null): string => {
  if (period !== null) return `sampled, ${Number((period * 1000).toPrecision(6))} ms`;
  return statedContinuous ? 'continuous, as stated' : 'nobody said how it is sampled';
};
