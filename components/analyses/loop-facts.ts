import type { Fact } from '@/components/ui/fact-table';
import type { Analysis, Quantity } from '@/contract';
import { formatFrequency, formatNumber } from '@/figures/format';
import { quantityName, quantityText, type ReaderUnits } from '@/figures/quantity-text';

const NO_LIMIT = 'no finite limit';

interface Reading {
  quantity: Quantity;
  value: number | null | undefined;
  frequency?: number | null;
}

const stability = ({ margins, sensitivity }: Analysis): Reading[] => [
  { quantity: 'ms', value: sensitivity.ms.value, frequency: sensitivity.ms.frequency },
  { quantity: 'mt', value: sensitivity.mt.value, frequency: sensitivity.mt.frequency },
  { quantity: 'phaseMargin', value: margins.phase?.degrees, frequency: margins.phase?.frequency },
  { quantity: 'gainMargin', value: margins.gain?.factor, frequency: margins.gain?.frequency },
  { quantity: 'gainReduction', value: margins.gainReduction?.factor, frequency: margins.gainReduction?.frequency },
  { quantity: 'delayMargin', value: margins.delay?.seconds, frequency: margins.delay?.frequency },
  { quantity: 'modulusMargin', value: margins.modulus },
  { quantity: 'diskMargin', value: margins.disk.alpha },
];

/** The margins and peaks of a loop; struck out where the loop is not stable, since they have no meaning there. */
export function marginFacts(analysis: Analysis, units: ReaderUnits): Fact[] {
  const struck = !analysis.closedLoop.stable;
  return stability(analysis).map(({ quantity, value, frequency }) => ({
    name: quantityName(quantity),
    value: value == null ? '–' : quantityText(quantity, value, units).text,
    aside:
      value == null ? NO_LIMIT : frequency == null ? undefined : `at ${formatFrequency(frequency, units.frequency)} ${units.frequency}`,
    struck: struck && value != null,
  }));
}

/** How the loop answers its reference and a load; empty where it cannot settle. */
export function responseFacts(analysis: Analysis, units: ReaderUnits): Fact[] {
  const metrics = analysis.timeResponse?.metrics;
  if (!metrics) return [];
  const read = (quantity: Quantity, value: number | null, aside?: string): Fact => ({
    name: quantityName(quantity),
    value: value === null ? '–' : quantityText(quantity, value, units).text,
    aside,
  });
  const peakTime = metrics.loadPeakTime;
  return [
    read('riseTime', metrics.riseTime, '10 to 90 %'),
    read('settlingTime', metrics.settlingTime, 'within 2 %'),
    read('overshootPercent', metrics.overshootPercent),
    read('steadyStateError', metrics.steadyStateError),
    read('loadPeak', metrics.loadPeak, peakTime === null ? undefined : `after ${formatNumber(peakTime, 2)} s`),
    read('loadSettlingTime', metrics.loadSettlingTime),
    read('controlPeak', metrics.controlPeak),
  ];
}
