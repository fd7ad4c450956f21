import type { Fact } from '@/components/ui/fact-table';
import type { Analysis, Quantity } from '@/contract';
import { formatDegrees, formatFactor, formatFrequency, formatNumber, withUnit } from '@/figures/format';
import { quantityName, quantityText, type ReaderUnits } from '@/figures/quantity-text';

const NO_LIMIT = 'no finite limit';
const AT_INFINITY = 'as frequency grows';

interface Reading {
  quantity: Quantity;
  value: number | null | undefined;
  frequency?: number | null;
  /** What a null means, where it is not "no finite limit". */
  none?: string;
  /** What stands beside the number in place of its frequency. */
  aside?: string;
}

const at = (frequency: number, { frequency: unit }: ReaderUnits) => `at ${withUnit(formatFrequency(frequency, unit), unit)}`;

function read({ quantity, value, frequency, none = NO_LIMIT, aside }: Reading, units: ReaderUnits, struck = false): Fact {
  if (value == null) return { name: quantityName(quantity), value: '–', aside: none };
  const place = frequency === null ? AT_INFINITY : frequency === undefined ? undefined : at(frequency, units);
  return { name: quantityName(quantity), value: quantityText(quantity, value, units).text, aside: aside ?? place, struck };
}

const diskWords = ({ gainLow, gainHigh, phaseDegrees }: Analysis['margins']['disk']) =>
  `gain × ${formatFactor(gainLow)} to ${gainHigh === null ? 'any' : formatFactor(gainHigh)}, or ±${formatDegrees(phaseDegrees)}°`;

const margins = ({ margins, sensitivity }: Analysis): Reading[] => [
  { quantity: 'ms', ...sensitivity.ms },
  { quantity: 'mt', ...sensitivity.mt },
  { quantity: 'phaseMargin', value: margins.phase?.degrees, frequency: margins.phase?.frequency, none: '|L| never crosses 1' },
  { quantity: 'gainMargin', value: margins.gain?.factor, frequency: margins.gain?.frequency },
  { quantity: 'gainReduction', value: margins.gainReduction?.factor, frequency: margins.gainReduction?.frequency },
  { quantity: 'delayMargin', value: margins.delay?.seconds, frequency: margins.delay?.frequency },
  { quantity: 'modulusMargin', value: margins.modulus, aside: 'least distance from −1' },
  { quantity: 'diskMargin', value: margins.disk.alpha, aside: diskWords(margins.disk) },
];

/** The margins and peaks of a loop; struck out where the loop is not stable, since they have no meaning there. */
export const marginFacts = (analysis: Analysis, units: ReaderUnits): Fact[] =>
  margins(analysis).map((reading) => read(reading, units, !analysis.closedLoop.stable));

/** Every place where |L| is 1 or L is real and negative, ascending in its kind, with the margin there. */
export function crossoverFacts({ margins, closedLoop }: Analysis, units: ReaderUnits): Fact[] {
  const struck = !closedLoop.stable;
  const gain = margins.gainCrossovers.map(({ frequency, phaseMarginDegrees }, i) => ({
    name: `Gain crossover ${i + 1}`,
    value: quantityText('phaseMargin', phaseMarginDegrees, units).text,
    aside: at(frequency, units),
    struck,
  }));
  const phase = margins.phaseCrossovers.map(({ frequency, gainMarginFactor }, i) => ({
    name: `Phase crossover ${i + 1}`,
    value: quantityText('gainMargin', gainMarginFactor, units).text,
    aside: frequency === null ? AT_INFINITY : at(frequency, units),
    struck,
  }));
  return [...gain, ...phase];
}

const unstableWords = (count: number) => (count === 1 ? '1 pole on the wrong side' : `${count} poles on the wrong side`);

/** Whether the closed loop is stable, how that was counted, how fast it is and what it makes of noise. */
export function closedLoopFacts({ closedLoop, bandwidth, sensitivity }: Analysis, units: ReaderUnits): Fact[] {
  const count = (value: number) => formatNumber(value, 0);
  const band = (name: string, value: number | null, aside: string) => ({
    name,
    value: value === null ? '–' : quantityText('bandwidth', value, units).text,
    aside: value === null ? 'no such passage' : aside,
  });
  const { noiseGain } = sensitivity;
  return [
    {
      name: 'Closed loop',
      value: closedLoop.stable ? 'stable' : 'unstable',
      aside: closedLoop.stable ? undefined : unstableWords(closedLoop.unstablePoles),
    },
    { name: 'Encirclements of −1', value: count(closedLoop.encirclements), aside: `needed ${count(closedLoop.encirclementsNeeded)}` },
    band('Bandwidth, |T|', bandwidth.closedLoop, 'falls to 0.71 of |T(0)|'),
    band('Bandwidth, reference', bandwidth.reference, 'of its response, likewise'),
    band('Bandwidth, |S|', bandwidth.sensitivity, 'rises through 0.71'),
    read({ quantity: 'noiseGain', ...noiseGain, none: 'without bound' }, units),
  ];
}
