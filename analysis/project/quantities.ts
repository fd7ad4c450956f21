import type { Analysis, Quantity } from '@/contract';

/** How one quantity is read off an analysis and judged. */
export interface Reading {
  /** The number in the contract's unit; null as numerics.md says. */
  readonly value: (analysis: Analysis) => number | null;
  /** rad/s where the number was found; null where it has no frequency of its own. */
  readonly frequency: (analysis: Analysis) => number | null;
  /** Whether it is judged by magnitude: a sign says in which direction, not how well. */
  readonly byMagnitude: boolean;
  /** The one scale on which limit, target and value are compared. */
  readonly scale: (value: number) => number;
  /** Whether more of the quantity is less on its scale. */
  readonly turnsOrder: boolean;
  /** Stability quantities come before performance in the headline. */
  readonly stability: boolean;
  /** Whether it is read off a time response. */
  readonly fromResponse: boolean;
  /** Whether null means "no finite limit", which meets any demand in a stable loop. */
  readonly nullIsUnlimited: boolean;
}

const nowhere = () => null;
const asIs = (value: number) => value;
const decibels = (value: number) => 20 * Math.log10(value);
const inverse = { scale: (value: number) => 1 / value, turnsOrder: true };

type Parts = Pick<Reading, 'value'> & Partial<Reading>;
const stability = (parts: Parts): Reading => ({
  frequency: nowhere,
  byMagnitude: false,
  scale: asIs,
  turnsOrder: false,
  stability: true,
  fromResponse: false,
  nullIsUnlimited: false,
  ...parts,
});
const performance = (parts: Parts): Reading => ({ ...stability(parts), stability: false });

type Metric = keyof NonNullable<NonNullable<Analysis['timeResponse']>['metrics']>;
const metric = (name: Metric, parts: Partial<Reading> = {}) =>
  performance({ value: (analysis) => analysis.timeResponse?.metrics?.[name] ?? null, fromResponse: true, ...parts });

/** Every quantity that a project can demand a limit for. */
export const quantities: Readonly<Record<Quantity, Reading>> = {
  gainMargin: stability({
    value: ({ margins }) => margins.gain?.factor ?? null,
    frequency: ({ margins }) => margins.gain?.frequency ?? null,
    scale: decibels,
    nullIsUnlimited: true,
  }),
  gainReduction: stability({
    value: ({ margins }) => margins.gainReduction?.factor ?? null,
    frequency: ({ margins }) => margins.gainReduction?.frequency ?? null,
    scale: decibels,
    nullIsUnlimited: true,
  }),
  phaseMargin: stability({
    value: ({ margins }) => margins.phase?.degrees ?? null,
    frequency: ({ margins }) => margins.phase?.frequency ?? null,
    byMagnitude: true,
    nullIsUnlimited: true,
  }),
  delayMargin: stability({
    value: ({ margins }) => margins.delay?.seconds ?? null,
    frequency: ({ margins }) => margins.delay?.frequency ?? null,
    nullIsUnlimited: true,
  }),
  ms: stability({
    value: ({ sensitivity }) => sensitivity.ms.value,
    frequency: ({ sensitivity }) => sensitivity.ms.frequency,
    ...inverse,
  }),
  mt: stability({
    value: ({ sensitivity }) => sensitivity.mt.value,
    frequency: ({ sensitivity }) => sensitivity.mt.frequency,
    ...inverse,
  }),
  modulusMargin: stability({ value: ({ margins }) => margins.modulus, frequency: ({ sensitivity }) => sensitivity.ms.frequency }),
  diskMargin: stability({ value: ({ margins }) => margins.disk.alpha }),
  noiseGain: performance({
    value: ({ sensitivity }) => sensitivity.noiseGain.value,
    frequency: ({ sensitivity }) => sensitivity.noiseGain.frequency,
    scale: decibels,
  }),
  bandwidth: performance({ value: ({ bandwidth }) => bandwidth.closedLoop, frequency: ({ bandwidth }) => bandwidth.closedLoop }),
  riseTime: metric('riseTime'),
  settlingTime: metric('settlingTime'),
  overshootPercent: metric('overshootPercent'),
  undershootPercent: metric('undershootPercent'),
  steadyStateError: metric('steadyStateError', { byMagnitude: true }),
  loadPeak: metric('loadPeak'),
  loadSettlingTime: metric('loadSettlingTime'),
  controlPeak: metric('controlPeak'),
};

/** The number that limit and target are laid against. */
export const judgedValue = (quantity: Quantity, value: number) => (quantities[quantity].byMagnitude ? Math.abs(value) : value);
